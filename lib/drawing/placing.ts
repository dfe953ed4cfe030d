import type { Box, Point } from './boxes'
import { textSizes } from './inks'
import { layText, type LaidText } from './measure'
import type { Mark, PlacedLabel } from './plate'
import type { Projection } from './projection'
import type { Dimension, LabelAlong, LabelAt, LabelRequest } from './sketch'

/** A label that found its place, what is drawn with it, and how far it is from where it was wanted. */
export interface Placement {
  label: PlacedLabel
  marks: Mark[]
  cost: number
}

/** Air round every label, px at full text size. */
export const clearance = 3

/** A label's size before it has a place. */
export interface Body {
  text: LaidText
  halfWidth: number
  halfHeight: number
  badge?: 'disc'
}

type Align = 'start' | 'middle' | 'end'

/** One request is laid out once, though it is tried in hundreds of places. */
const laid = new WeakMap<LabelRequest, { textScale: number } & Partial<Record<Align, Body>>>()

/** A request's size on paper, its lines set to one side or centred. */
export function bodyOf(request: LabelRequest, { textScale }: Projection, align: Align = 'middle'): Body {
  const before = laid.get(request)
  const known = before?.textScale === textScale ? before : { textScale }
  if (known !== before) laid.set(request, known)
  return (known[align] ??= layBody(request, textScale, align))
}

function layBody(request: LabelRequest, textScale: number, align: Align): Body {
  const text = layText(request.text, request.size, textScale, align)
  const badge = badgeOf(request)
  if (badge) {
    const radius = Math.max(textSizes[request.size] * textScale * 0.72, text.width / 2 + 4)
    return { text, halfWidth: radius, halfHeight: radius, badge }
  }
  return { text, halfWidth: text.width / 2, halfHeight: (text.ascent + text.descent) / 2 }
}

function badgeOf(request: LabelAt | LabelAlong | Dimension) {
  return request.kind === 'dimension' ? undefined : request.badge
}

/** The box of a body centred here; turn in degrees, clockwise as paper turns. */
export function boxAt(body: Body, centre: Point, turn = 0): Box {
  const angle = (turn * Math.PI) / 180
  return {
    x: centre.x,
    y: centre.y,
    halfWidth: body.halfWidth,
    halfHeight: body.halfHeight,
    cos: turn === 0 ? 1 : Math.cos(angle),
    sin: turn === 0 ? 0 : Math.sin(angle),
  }
}

/** Sets the words into their box: a disc centres its capital, a label starts at its first baseline. */
export function labelIn(request: LabelRequest, body: Body, box: Box, turn = 0): PlacedLabel {
  const left = body.badge ? -body.text.width / 2 : -body.halfWidth
  const baseline = body.badge ? body.text.ascent / 2 : -body.halfHeight + body.text.ascent
  return {
    runs: body.text.runs,
    x: box.x + left * box.cos - baseline * box.sin,
    y: box.y + left * box.sin + baseline * box.cos,
    turn,
    box,
    badge: body.badge,
    part: request.part,
  }
}

/** Turn of a line as a reader wants it: never upside down. Degrees clockwise. */
export function uprightTurn(from: Point, to: Point): number {
  const turn = (Math.atan2(to.y - from.y, to.x - from.x) * 180) / Math.PI
  if (turn > 90.01) return turn - 180
  return turn < -90.01 ? turn + 180 : turn
}

export function between(a: Point, b: Point, share: number): Point {
  return { x: a.x + (b.x - a.x) * share, y: a.y + (b.y - a.y) * share }
}

export function moved(point: Point, direction: Point, distance: number): Point {
  return { x: point.x + direction.x * distance, y: point.y + direction.y * distance }
}
