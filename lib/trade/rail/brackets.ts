import { cosDeg, tanDeg } from '../angles'
import { longOnTop } from '../piece'
import { spaceMarks } from '../spacing'
import { hair } from '../tolerance'
import type {
  BracketOffRail,
  FieldBracket,
  FieldBracketsGiven,
  PartEnd,
  RailPart,
  SpacedBrackets,
  SpacedBracketsGiven,
} from './types'

const faceSign = ({ longPoint }: PartEnd) => (longPoint === 'room side (plan)' ? 0 : longOnTop(longPoint))

/** A mark on top plumbed to the underside, and measured there from the underside's own low corner. */
function underside({ slope, endA, setbackA }: RailPart, depth: number, along: number): number {
  return along - depth * tanDeg(slope) - faceSign(endA) * setbackA
}

/** Evenly spaced brackets: on every rake, and on other parts with room for both end distances and a foot between. */
export function spaceBrackets(parts: readonly RailPart[], given: SpacedBracketsGiven, depth: number): SpacedBrackets[] {
  return parts
    .filter(({ kind, topEdge }) => kind === 'rake' || topEdge >= 2 * given.endDistance + 12 - hair)
    .map((part) => {
      const { spacing, marks } = spaceMarks(part.topEdge, given.endDistance, given.maxSpacing)
      const alongUndersideFromLowEnd = marks.map((along) => underside(part, depth, along))
      return { part: part.mark, spacing, alongTopFromLowEnd: marks, alongUndersideFromLowEnd }
    })
}

const holds = ({ corners: { topA, topB } }: RailPart, x: number) => x >= topA.x - hair && x <= topB.x + hair

/** Whether a knuckle stands nearer than `clear`; free ends are no knuckles. */
function nearKnuckle(parts: readonly RailPart[], index: number, along: number, clear: number): boolean {
  const part = parts[index]
  if (!part) return false
  const below = index > 0 ? along : Infinity
  const above = index < parts.length - 1 ? part.topEdge - along : Infinity
  return Math.min(below, above) < clear - hair
}

/** Brackets set by the wall: where each comes on the rail, and whether a knuckle is in its way. */
export function placeFieldBrackets(
  parts: readonly RailPart[],
  { field, jointClear }: FieldBracketsGiven,
  depth: number,
): (FieldBracket | BracketOffRail)[] {
  return field.map((x, i) => {
    const n = i + 1
    const index = parts.findIndex((part) => holds(part, x))
    const part = parts[index]
    if (!part) return { n, off: true }
    const along = (x - part.corners.topA.x) / cosDeg(part.slope)
    return {
      n,
      part: part.mark,
      fromBottomNosingHorizontal: x,
      alongTopFromLowEnd: along,
      alongUndersideFromLowEnd: underside(part, depth, along),
      tooCloseToJoint: nearKnuckle(parts, index, along, jointClear ?? 3),
    }
  })
}
