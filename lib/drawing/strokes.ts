import type { ArcStroke, Fill, Ink, PathStroke, Spot } from './sketch'

type Extra = Pick<PathStroke, 'part' | 'passable'>

/** A point in inches, moved by px on paper. */
export const spot = (x: number, y: number, dx = 0, dy = 0): Spot => ({ x, y, dx, dy })

/** A spot so far away in a direction: inches, degrees from level. */
export function toward(from: Spot, degrees: number, inches: number): Spot {
  const turn = (degrees * Math.PI) / 180
  return { ...from, x: from.x + inches * Math.cos(turn), y: from.y + inches * Math.sin(turn) }
}

/** A spot moved on paper: px, degrees from level. */
export function nudged(from: Spot, degrees: number, px: number): Spot {
  const turn = (degrees * Math.PI) / 180
  return { ...from, dx: (from.dx ?? 0) + px * Math.cos(turn), dy: (from.dy ?? 0) + px * Math.sin(turn) }
}

/** A line through these spots. */
export const path = (ink: Ink, points: readonly Spot[], extra?: Extra): PathStroke => ({ kind: 'path', ink, points, ...extra })

/** A closed outline, filled or open. */
export const outline = (ink: Ink, points: readonly Spot[], fill?: Fill, extra?: Extra): PathStroke => ({
  kind: 'path', ink, points, closed: true, fill, ...extra,
})

/** An arc of a radius on paper, px; degrees from level, counterclockwise. */
export const angleArc = (centre: Spot, paper: number, from: number, to: number, ink: Ink = 'dim'): ArcStroke => ({
  kind: 'arc', centre, radius: { paper }, from, to, ink,
})

/** The filled triangle at a long point: its tip on the corner, its back toward `way` degrees. */
export function longPoint(tip: Spot, way: number, part?: string, size = 12): PathStroke {
  return outline('flag', [tip, nudged(tip, way + 27, size), nudged(tip, way - 27, size)], 'solid', { part })
}

/** Zigzag where a bar goes on beyond the drawing, across from one face to the other. */
export function breakLine(a: Spot, b: Spot, part?: string): PathStroke {
  const along = (share: number, off: number): Spot => {
    const dx = b.x - a.x
    const dy = b.y - a.y
    return { x: a.x + dx * share - dy * off, y: a.y + dy * share + dx * off, dx: a.dx, dy: a.dy }
  }
  return path('dim', [along(-0.18, 0), along(0.34, 0), along(0.44, 0.22), along(0.56, -0.22), along(0.66, 0), along(1.18, 0)], { part })
}
