import type { Field } from './field'
import { between, bodyOf, boxAt, clearance, labelIn, moved, uprightTurn, type Placement } from './placing'
import { project, type Projection } from './projection'
import type { LabelAlong } from './sketch'

/** Shares of the line to try: its middle first, then to either side. */
const shares = [0.5, 0.42, 0.58, 0.34, 0.66, 0.26, 0.74, 0.18, 0.82, 0.1, 0.9]

/** Sets a label along its line, above, below or on it. */
export function placeAlong(request: LabelAlong, projection: Projection, field: Field): Placement | null {
  const scale = projection.textScale
  const from = project(request.from, projection)
  const to = project(request.to, projection)
  const turn = request.badge ? 0 : uprightTurn(from, to)
  const lineTurn = (uprightTurn(from, to) * Math.PI) / 180
  const up = { x: Math.sin(lineTurn), y: -Math.cos(lineTurn) }
  const body = bodyOf(request, projection)
  if (request.side === 'within' && body.halfWidth * 2 > Math.hypot(to.x - from.x, to.y - from.y)) return null
  const sign = { above: 1, below: -1, within: 0 }[request.side]
  const gap = request.gap ?? 7
  for (let off = gap; off <= gap + (request.reach ?? 40); off += 6) {
    for (const [rank, share] of shares.entries()) {
      const centre = moved(between(from, to, share), up, sign * (off * scale + body.halfHeight))
      const box = boxAt(body, centre, turn)
      if (field.isFree(box, clearance * scale)) {
        return { label: labelIn(request, body, box, turn), marks: [], cost: rank * 0.25 + (off - gap) / 12 }
      }
    }
    if (request.side === 'within') return null
  }
  return null
}
