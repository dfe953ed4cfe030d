import type { Point } from './boxes'
import { inkWidths } from './inks'
import type { Mark } from './plate'
import type { Spot, Stroke } from './sketch'

/** Model to paper at one scale: px, y down, the model's origin at 0, 0. */
export interface Projection {
  scale: number
  textScale: number
  lineScale: number
  /** Times further than usual a required label may drift: 1 until the paper had to grow. */
  patience: number
}

/** Where a spot falls. Its paper offset grows with the text, so that gaps suit the words. */
export function project({ x, y, dx = 0, dy = 0 }: Spot, { scale, textScale }: Projection): Point {
  return { x: x * scale + dx * textScale, y: -y * scale - dy * textScale }
}

/** A stroke as it will be drawn. */
export function markOf(stroke: Stroke, projection: Projection): Mark {
  const shared = {
    ink: stroke.ink,
    width: inkWidths[stroke.ink] * projection.lineScale,
    part: stroke.part,
    passable: stroke.passable,
  }
  if (stroke.kind === 'arc') return { ...shared, points: arcPoints(stroke, projection), closed: false }
  return {
    ...shared,
    points: stroke.points.map((spot) => project(spot, projection)),
    closed: stroke.closed ?? false,
    fill: stroke.fill,
  }
}

function arcPoints(arc: Extract<Stroke, { kind: 'arc' }>, projection: Projection): Point[] {
  const centre = project(arc.centre, projection)
  const radius = 'inches' in arc.radius ? arc.radius.inches * projection.scale : arc.radius.paper * projection.textScale
  // Chords under 4° leave the eye no corner; always as many, so that an arc can ease to another angle.
  const steps = Math.abs(arc.to - arc.from) > 120 ? 96 : 32
  return Array.from({ length: steps + 1 }, (_, i) => {
    const turn = ((arc.from + ((arc.to - arc.from) * i) / steps) * Math.PI) / 180
    return { x: centre.x + radius * Math.cos(turn), y: centre.y - radius * Math.sin(turn) }
  })
}
