import type { Field } from './field'
import { placeAlong } from './place-along'
import { placeAt } from './place-at'
import { placeDimension } from './place-dimension'
import type { Placement } from './placing'
import type { Projection } from './projection'
import type { Dimension, LabelAlong, LabelAt, LabelRequest } from './sketch'

/** A dimension that became a label on a leader says less. */
const besideCost = 12
const otherwiseCost = 0.3

/** Finds a label its place: as asked, else in its second form, else null. */
export function place(request: LabelRequest, projection: Projection, field: Field): Placement | null {
  const first = placeAsked(request, projection, field)
  if (first || !request.otherwise) return first
  const second = place(request.otherwise, projection, field)
  return second && { ...second, cost: second.cost + otherwiseCost }
}

function placeAsked(request: LabelRequest, projection: Projection, field: Field): Placement | null {
  if (request.kind === 'at') return placeAt(request, projection, field)
  const wished =
    request.kind === 'dimension' ? placeDimension(request, projection, field) : placeAlong(request, projection, field)
  if (wished || !request.required) return wished
  const beside = placeAt(besideMiddle(request), projection, field)
  return beside && { ...beside, cost: beside.cost + besideCost }
}

/** A label that must stand, and found no room along its line, hangs on a leader from the middle of it. */
function besideMiddle(request: LabelAlong | Dimension): LabelAt {
  const { from, to, text, size, part, required, side } = request
  const badge = request.kind === 'along' ? request.badge : undefined
  const half = (a = 0, b = 0) => (a + b) / 2
  const spot = { x: half(from.x, to.x), y: half(from.y, to.y), dx: half(from.dx, to.dx), dy: half(from.dy, to.dy) }
  return {
    kind: 'at',
    text,
    size,
    part,
    badge,
    required,
    spot,
    prefer: side === 'below' || side === 'right' ? [-90, -60, -120] : [90, 60, 120],
    gap: 14,
  }
}
