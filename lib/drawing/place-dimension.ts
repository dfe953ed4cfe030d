import { segmentTouches, type Point } from './boxes'
import type { Field } from './field'
import { inkWidths } from './inks'
import type { Mark } from './plate'
import { between, bodyOf, boxAt, clearance, labelIn, moved, uprightTurn, type Body, type Placement } from './placing'
import { project, type Projection } from './projection'
import type { Dimension, Ink } from './sketch'

const shares = [0.5, 0.36, 0.64, 0.22, 0.78]
/** Lines that a dimension line does not run through while there is another place. */
const kept: ReadonlySet<Ink> = new Set(['object', 'post', 'cut', 'dim', 'tape'])

interface Run {
  from: Point
  to: Point
  /** Off the object, unit length. */
  out: Point
  /** What is measured, on paper. */
  a: Point
  b: Point
}

/** Stands a dimension off its object, further out until its line and words run into nothing. */
export function placeDimension(request: Dimension, projection: Projection, field: Field): Placement | null {
  const scale = projection.textScale
  const body = bodyOf(request, projection)
  const step = request.step ?? 13
  for (let i = 0; i < (request.tries ?? 9); i++) {
    const run = runAt(request, projection, ((request.offset ?? 22) + i * step) * scale)
    const marks = marksOf(run, request, projection)
    if (!marks.every((mark) => isClearMark(mark, field, scale))) continue
    const label = labelOn(run, request, body, field, marks, scale)
    if (!label) continue
    const crossed = field.crossings(run.from, run.to, kept)
    // A line through the object misleads more than one that stands far off; at 0 it is drawn on the thing itself.
    if (crossed > 0 && i < 5 && request.offset !== 0) continue
    return { ...label, marks, cost: label.cost + i * 0.8 + (request.offset === 0 ? 0 : crossed * 4) }
  }
  return null
}

function runAt({ from, to, side, measure = 'aligned' }: Dimension, projection: Projection, offset: number): Run {
  const a = project(from, projection)
  const b = project(to, projection)
  const length = Math.hypot(b.x - a.x, b.y - a.y) || 1
  const left = { x: (b.y - a.y) / length, y: -(b.x - a.x) / length }
  const sign = side === 'left' ? 1 : -1
  if (measure === 'aligned') {
    const out = { x: left.x * sign, y: left.y * sign }
    return { from: moved(a, out, offset), to: moved(b, out, offset), out, a, b }
  }
  if (measure === 'level') {
    const out = { x: 0, y: Math.sign(left.y || -1) * sign }
    const y = (out.y < 0 ? Math.min(a.y, b.y) : Math.max(a.y, b.y)) + out.y * offset
    return { from: { x: a.x, y }, to: { x: b.x, y }, out, a, b }
  }
  const out = { x: Math.sign(left.x || -1) * sign, y: 0 }
  const x = (out.x < 0 ? Math.min(a.x, b.x) : Math.max(a.x, b.x)) + out.x * offset
  return { from: { x, y: a.y }, to: { x, y: b.y }, out, a, b }
}

function marksOf({ from, to, out, a, b }: Run, request: Dimension, projection: Projection): Mark[] {
  const ink = request.ink ?? 'dim'
  const line = (points: Point[], which: Ink): Mark => ({
    points,
    closed: false,
    ink: which,
    width: inkWidths[which] * projection.lineScale,
    part: request.part,
  })
  const extension = (at: Point, end: Point) => {
    const reach = (end.x - at.x) * out.x + (end.y - at.y) * out.y
    return reach > 10 * projection.textScale
      ? [line([moved(at, out, 4), moved(end, out, 5 * projection.textScale)], 'ext')]
      : []
  }
  return [line([from, to], ink), tick(from, from, to), tick(to, from, to), ...extension(a, from), ...extension(b, to)]

  function tick(at: Point, p: Point, q: Point): Mark {
    const along = Math.atan2(q.y - p.y, q.x - p.x) - Math.PI / 4
    const arm = 5.2 * projection.textScale
    const way = { x: Math.cos(along), y: Math.sin(along) }
    return { ...line([moved(at, way, -arm), moved(at, way, arm)], ink), width: 2 * projection.lineScale }
  }
}

function isClearMark(mark: Mark, field: Field, scale: number): boolean {
  const [a, b] = mark.points
  if (!a || !b) return true
  const extent = {
    left: Math.min(a.x, b.x),
    right: Math.max(a.x, b.x),
    top: Math.min(a.y, b.y),
    bottom: Math.max(a.y, b.y),
  }
  return field.holds(extent) && field.isClear(a, b, clearance * scale)
}

/** Words above their line, else below it, else past its end; clear of the ticks and of its own lines. */
function labelOn(
  run: Run,
  request: Dimension,
  body: Body,
  field: Field,
  marks: Mark[],
  scale: number,
): Omit<Placement, 'marks'> | null {
  const turn = uprightTurn(run.from, run.to)
  const angle = (turn * Math.PI) / 180
  const up = { x: Math.sin(angle), y: -Math.cos(angle) }
  const along = { x: Math.cos(angle), y: Math.sin(angle) }
  const length = Math.hypot(run.to.x - run.from.x, run.to.y - run.from.y)
  const roomy = body.halfWidth * 2 + 18 * scale < length
  const gap = (roomy ? 5 : 9) * scale + body.halfHeight
  const [first, last] =
    along.x * (run.to.x - run.from.x) + along.y * (run.to.y - run.from.y) >= 0 ? [run.from, run.to] : [run.to, run.from]
  const past = 11 * scale + body.halfWidth
  const middle = between(run.from, run.to, 0.5)
  const inner = roomy ? shares : [0.5]
  const spread = 10 * scale + Math.abs(run.out.x) * body.halfWidth + Math.abs(run.out.y) * body.halfHeight
  const upright = { centre: moved(middle, run.out, spread), turn: 0 }
  const turned = [
    ...inner.map((share) => moved(between(run.from, run.to, share), up, gap)),
    ...inner.map((share) => moved(between(run.from, run.to, share), up, -gap)),
    moved(last, along, past),
    moved(first, along, -past),
  ].map((centre) => ({ centre, turn }))
  // Words longer than a steep line read better level beside it.
  const places = roomy || Math.abs(turn) < 30 ? [...turned, upright] : [upright, ...turned]
  for (const [rank, place] of places.entries()) {
    const box = boxAt(body, place.centre, place.turn)
    if (field.isFree(box, clearance * scale) && marks.every((mark) => !touches(mark, box))) {
      return { label: labelIn(request, body, box, place.turn), cost: rank * 0.9 }
    }
  }
  return null
}

function touches(mark: Mark, box: ReturnType<typeof boxAt>): boolean {
  const [a, b] = mark.points
  return a !== undefined && b !== undefined && segmentTouches(box, a, b, mark.width / 2 + 1)
}
