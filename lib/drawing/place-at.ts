import type { Box, Point } from './boxes'
import type { Field } from './field'
import { inkWidths } from './inks'
import { bodyOf, boxAt, clearance, labelIn, moved, type Placement } from './placing'
import { project, type Projection } from './projection'
import type { Ink, LabelAt } from './sketch'

const solid: ReadonlySet<Ink> = new Set(['object', 'post', 'cut', 'dim'])
const everyWay = [...Array(16).keys()].map((i) => i * 22.5)
/** Beyond this a label no longer says by itself what it belongs to. */
const leaderFrom = 15

/** Puts a label beside its spot: near before far, wished directions before others. */
export function placeAt(request: LabelAt, projection: Projection, field: Field): Placement | null {
  const spot = project(request.spot, projection)
  const scale = projection.textScale
  const reach = request.required ? (request.reach ?? 150) * projection.patience : (request.reach ?? 50)
  const farWays = ways(request.prefer)
  for (const distance of distances(request.gap ?? 7, reach)) {
    for (const [rank, way] of (distance < leaderFrom ? request.prefer : farWays).entries()) {
      const placement = tryAt(request, projection, field, spot, way, distance * scale)
      if (!placement) continue
      const stray = rank < request.prefer.length ? rank * 0.2 : 4
      return { ...placement, cost: placement.cost + stray + distance / 14 }
    }
  }
  return null
}

function distances(gap: number, reach: number): number[] {
  const all = [gap]
  for (let d = gap; d < reach;) {
    d += Math.max(5, d * 0.34)
    all.push(Math.min(d, reach))
  }
  return all
}

/** Every way to try once a label needs a leader: the wished ones, then the others by how near they come to them. */
function ways(prefer: readonly number[]): readonly number[] {
  const wanted = prefer[0] ?? 90
  const off = (way: number) => Math.abs(((way - wanted + 540) % 360) - 180)
  return [...prefer, ...everyWay.toSorted((a, b) => off(a) - off(b) || a - b)]
}

function tryAt(
  request: LabelAt,
  projection: Projection,
  field: Field,
  spot: Point,
  way: number,
  distance: number,
): Placement | null {
  const direction = { x: Math.cos((way * Math.PI) / 180), y: -Math.sin((way * Math.PI) / 180) }
  const align = direction.x > 0.5 ? 'start' : direction.x < -0.5 ? 'end' : 'middle'
  const body = bodyOf(request, projection, align)
  const longest = Math.max(Math.abs(direction.x), Math.abs(direction.y))
  const near = moved(spot, direction, distance)
  const box = boxAt(body, {
    x: near.x + (direction.x / longest) * body.halfWidth,
    y: near.y + (direction.y / longest) * body.halfHeight,
  })
  if (!field.isFree(box, clearance * projection.textScale)) return null
  const label = labelIn(request, body, box)
  if (request.leader === false || distance < leaderFrom * projection.textScale) return { label, marks: [], cost: 0 }
  return withLeader(spot, box, projection, field, { label, marks: [], cost: 0 }, request.part)
}

/** A hair line from the spot to the near edge of its label, which may cross no other label. */
function withLeader(
  spot: Point,
  box: Box,
  projection: Projection,
  field: Field,
  placement: Placement,
  part?: string,
): Placement | null {
  const end = {
    x: Math.min(Math.max(spot.x, box.x - box.halfWidth), box.x + box.halfWidth),
    y: Math.min(Math.max(spot.y, box.y - box.halfHeight), box.y + box.halfHeight),
  }
  const length = Math.hypot(end.x - spot.x, end.y - spot.y)
  const toward = { x: (end.x - spot.x) / length, y: (end.y - spot.y) / length }
  const a = moved(spot, toward, 3)
  const b = moved(end, toward, -4)
  if (!field.isClear(a, b, clearance)) return null
  const leader = {
    points: [a, b],
    closed: false,
    ink: 'ext' as const,
    width: inkWidths.ext * projection.lineScale,
    part,
  }
  return { ...placement, marks: [leader], cost: 1.5 + field.crossings(a, b, solid) * 3 }
}
