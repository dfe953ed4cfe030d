import type { Point } from './boxes'
import type { PlacedLabel, Plate } from './plate'

/** The drawing a share of the way from one state to the next, or null when the two are not drawn alike. */
export function blend(from: Plate, to: Plate, share: number): Plate | null {
  const alike =
    from.width === to.width &&
    from.marks.length === to.marks.length &&
    from.labels.length === to.labels.length &&
    to.marks.every((mark, i) => mark.points.length === from.marks[i]?.points.length && mark.ink === from.marks[i]?.ink)
  if (!alike) return null
  const marks = to.marks.map((mark, i) => ({
    ...mark,
    points: mark.points.map((p, j) => mix(from.marks[i]?.points[j] ?? p, p, share)),
  }))
  return { ...to, marks, labels: to.labels.map((label, i) => mixLabel(from.labels[i] ?? label, label, share)) }
}

function mix(a: Point, b: Point, share: number): Point {
  return { x: a.x + (b.x - a.x) * share, y: a.y + (b.y - a.y) * share }
}

function mixLabel(from: PlacedLabel, to: PlacedLabel, share: number): PlacedLabel {
  const turn = from.turn + (to.turn - from.turn) * share
  return { ...to, ...mix(from, to, share), turn, box: { ...to.box, ...mix(from.box, to.box, share) } }
}
