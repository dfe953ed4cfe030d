import type { Extent, Point } from './boxes'
import { Field } from './field'
import { place } from './place'
import type { Placement } from './placing'
import type { Mark, Plate } from './plate'
import { largestScale, type Room } from './largest-scale'
import { markOf, type Projection } from './projection'
import type { LabelRequest, Sketch, Stroke } from './sketch'

/** The paper to fill, px. Paper too small for the sketch grows. */
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
const mostGrowth = 24

/** Fits a sketch to its paper, to scale, with no label on a line or on another. Pure and repeatable. */
export function compose(sketch: Sketch, viewport: Viewport): Plate {
  const margin = viewport.margin ?? 18
  const labels = [...sketch.labels.filter((l) => l.required), ...sketch.labels.filter((l) => !l.required)]
  const textScale = viewport.textScale ?? 1
  let paper: Room = { width: viewport.width, height: viewport.height }
  for (let growth = 0; ; growth++) {
    const room = { width: paper.width - 2 * margin, height: paper.height - 2 * margin }
    const largest = largestScale(sketch.strokes, room, textScale)
    const sizes = { textScale, lineScale: viewport.lineScale ?? 1, patience: 1 + growth * 0.5 }
    // A drawing without one of its labels is better than none, should the largest paper not hold them all.
    const asked = growth < mostGrowth ? labels : labels.map((label) => ({ ...label, required: false }))
    const best = bestAttempt(sketch.strokes, asked, room, largest, sizes)
    if (best) return finish(best, sketch, { ...paper, margin, trim: viewport.trim ?? false })
    // Rows of a fixed height want a longer sheet; crowded words want a larger one.
    paper = { width: paper.width * (largest === 0 && growth < 12 ? 1 : 1.1), height: paper.height * 1.15 }
  }
}

function bestAttempt(
  strokes: readonly Stroke[],
  labels: readonly LabelRequest[],
  room: Room,
  largest: number,
  sizes: Omit<Projection, 'scale'>,
): Attempt | null {
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
function attemptAt(
  projection: Projection,
  strokes: readonly Stroke[],
  labels: readonly LabelRequest[],
  room: Room,
  affordable: number,
): Attempt | null {
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

/** Server and browser differ in the last digit of a tangent; what they draw must not. */
const tidy = (px: number) => Math.round(px * 1000) / 1000

/** Centres what was drawn on its paper. */
function finish(attempt: Attempt, sketch: Sketch, paper: Room & { margin: number; trim: boolean }): Plate {
  const { extent, placements } = attempt
  const height = paper.trim ? Math.min(paper.height, extent.bottom - extent.top + 2 * paper.margin) : paper.height
  const dx = paper.width / 2 - (extent.left + extent.right) / 2
  const dy = height / 2 - (extent.top + extent.bottom) / 2
  const shift = (p: Point): Point => ({ x: tidy(p.x + dx), y: tidy(p.y + dy) })
  return {
    width: paper.width,
    height,
    scale: attempt.scale,
    origin: { x: dx, y: dy },
    marks: [...attempt.marks, ...placements.flatMap((p) => p.marks)].map((mark) => ({
      ...mark,
      points: mark.points.map(shift),
    })),
    labels: placements.map(({ label }) => ({
      ...label,
      ...shift(label),
      turn: tidy(label.turn),
      box: { ...label.box, ...shift(label.box) },
    })),
    dropped: attempt.dropped,
    says: sketch.says,
  }
}
