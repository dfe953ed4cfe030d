import type { Extent } from './boxes'
import { Field } from './field'
import { placeAlong } from './place-along'
import { placeAt } from './place-at'
import { placeDimension } from './place-dimension'
import type { Placement } from './placing'
import type { Mark, Plate } from './plate'
import { markOf, type Projection } from './projection'
import type { Dimension, LabelAlong, LabelAt, LabelRequest, Sketch, Spot, Stroke } from './sketch'

/** The paper to fill, px. Paper too small for the sketch grows, height before width. */
export interface Viewport {
  width: number
  height: number
  /** 1 on a desk; about 0.78 on a phone. */
  textScale?: number
  /** 1 on screen; thinner in print. */
  lineScale?: number
  margin?: number
  /** Cut the height to what was drawn. */
  trim?: boolean
}

interface Attempt {
  scale: number
  marks: Mark[]
  placements: Placement[]
  extent: Extent
  dropped: number
  worth: number
}

/** Shares of the largest scale, tried from the top: a little smaller is worth it when labels then lie where they belong. */
const shares = [1, 0.94, 0.88, 0.82, 0.76, 0.7, 0.63, 0.56, 0.49, 0.42, 0.35, 0.28]
/** What it costs to leave out an optional label that does not say its own worth. */
const usualWorth = 4
/** A dimension that became a label on a leader says less. */
const besideCost = 12
const otherwiseCost = 0.3

/** Fits a sketch to its paper, to scale, with no label on a line or on another. Pure and repeatable. */
export function compose(sketch: Sketch, viewport: Viewport): Plate {
  const margin = viewport.margin ?? 18
  const labels = [...sketch.labels.filter((l) => l.required), ...sketch.labels.filter((l) => !l.required)]
  let width = viewport.width
  let height = viewport.height
  for (let growth = 0; ; growth++) {
    const room = { width: width - 2 * margin, height: height - 2 * margin }
    const best = bestAttempt(sketch.strokes, labels, room, viewport)
    if (best) return finish(best, sketch, { width, height, margin, trim: viewport.trim ?? false })
    height *= 1.2
    if (growth > 2) width *= 1.12
    if (growth > 30) throw new Error('This sketch has a required label that fits nowhere.')
  }
}

interface Room {
  width: number
  height: number
}

function bestAttempt(strokes: readonly Stroke[], labels: readonly LabelRequest[], room: Room, viewport: Viewport): Attempt | null {
  const sizes = { textScale: viewport.textScale ?? 1, lineScale: viewport.lineScale ?? 1 }
  const largest = largestScale(strokes, room, sizes.textScale)
  let best: Attempt | null = null
  for (const share of shares) {
    if (largest === 0 || (best && share * 100 <= best.worth)) break
    const affordable: number = best ? share * 100 - best.worth : Infinity
    const attempt = attemptAt({ ...sizes, scale: largest * share }, strokes, labels, room, affordable)
    if (attempt) best = { ...attempt, worth: attempt.worth + share * 100 }
  }
  return best
}

/** Lays everything out at one scale; null when a required label fits nowhere, or the whole costs more than is affordable. */
function attemptAt(projection: Projection, strokes: readonly Stroke[], labels: readonly LabelRequest[], room: Room, affordable: number): Attempt | null {
  const field = new Field(room.width, room.height)
  const marks = strokes.map((stroke) => markOf(stroke, projection))
  for (const mark of marks) field.addMark(mark)
  if (!field.holds()) return null
  const placements: Placement[] = []
  let dropped = 0
  let cost = 0
  for (const request of labels) {
    const placement = place(request, projection, field)
    if (!placement && request.required) return null
    cost += placement ? placement.cost : (request.worth ?? usualWorth)
    if (cost >= affordable) return null
    if (!placement) {
      dropped++
      continue
    }
    for (const mark of placement.marks) field.addMark(mark)
    field.addBox(placement.label.box)
    placements.push(placement)
  }
  return { scale: projection.scale, marks, placements, extent: field.extent, dropped, worth: -cost }
}

function place(request: LabelRequest, projection: Projection, field: Field): Placement | null {
  const first = placeAsked(request, projection, field)
  if (first || !request.otherwise) return first
  const second = place(request.otherwise, projection, field)
  return second && { ...second, cost: second.cost + otherwiseCost }
}

function placeAsked(request: LabelRequest, projection: Projection, field: Field): Placement | null {
  if (request.kind === 'at') return placeAt(request, projection, field)
  const wished = request.kind === 'dimension' ? placeDimension(request, projection, field) : placeAlong(request, projection, field)
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
  return { kind: 'at', text, size, part, badge, required, spot, prefer: side === 'below' || side === 'right' ? [-90, -60, -120] : [90, 60, 120], gap: 14 }
}

/** The largest scale at which the bare strokes fit, by halving; 0 when their paper-sized pieces alone do not. */
function largestScale(strokes: readonly Stroke[], room: Room, textScale: number): number {
  const spots = strokes.flatMap(spotsOf)
  const fits = (scale: number) => {
    const span = (at: (spot: Spot) => number) => {
      let low = Infinity
      let high = -Infinity
      for (const spot of spots) {
        const value = at(spot)
        if (value < low) low = value
        if (value > high) high = value
      }
      return high - low
    }
    return (
      span((s) => s.x * scale + (s.dx ?? 0) * textScale) <= room.width - 4 &&
      span((s) => s.y * scale + (s.dy ?? 0) * textScale) <= room.height - 4
    )
  }
  let low = 0
  let high = 1
  while (fits(high) && high < 1e6) high *= 2
  if (!fits(1e-9)) return 0
  for (let i = 0; i < 30; i++) {
    const middle = (low + high) / 2
    if (fits(middle)) low = middle
    else high = middle
  }
  return low
}

function spotsOf(stroke: Stroke): readonly Spot[] {
  if (stroke.kind === 'path') return stroke.points
  const { centre, radius } = stroke
  const size = 'inches' in radius ? { r: radius.inches, p: 0 } : { r: 0, p: radius.paper }
  const turns = Array.from({ length: 9 }, (_, i) => ((stroke.from + ((stroke.to - stroke.from) * i) / 8) * Math.PI) / 180)
  return turns.map((t) => ({
    x: centre.x + size.r * Math.cos(t),
    y: centre.y + size.r * Math.sin(t),
    dx: (centre.dx ?? 0) + size.p * Math.cos(t),
    dy: (centre.dy ?? 0) + size.p * Math.sin(t),
  }))
}

/** Centres what was drawn on its paper. */
function finish(attempt: Attempt, sketch: Sketch, paper: Room & { margin: number; trim: boolean }): Plate {
  const { extent, placements } = attempt
  const height = paper.trim ? Math.min(paper.height, extent.bottom - extent.top + 2 * paper.margin) : paper.height
  const dx = paper.width / 2 - (extent.left + extent.right) / 2
  const dy = height / 2 - (extent.top + extent.bottom) / 2
  const shifted = (mark: Mark): Mark => ({ ...mark, points: mark.points.map((p) => ({ x: p.x + dx, y: p.y + dy })) })
  return {
    width: paper.width,
    height,
    scale: attempt.scale,
    origin: { x: dx, y: dy },
    marks: [...attempt.marks, ...placements.flatMap((p) => p.marks)].map(shifted),
    labels: placements.map(({ label }) => ({
      ...label, x: label.x + dx, y: label.y + dy, box: { ...label.box, x: label.box.x + dx, y: label.box.y + dy },
    })),
    dropped: attempt.dropped,
    says: sketch.says,
  }
}
