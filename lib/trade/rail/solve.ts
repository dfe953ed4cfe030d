import type { CodeRow } from '../code-rows'
import { isRefusal, type Refusal } from '../refusal'
import { weldAround } from '../weld-length'
import { placeFieldBrackets, spaceBrackets } from './brackets'
import { closeFlights } from './closing'
import { judgeRail } from './code'
import { cutParts, jointsOf } from './parts'
import { inputFault } from './refusals'
import { cutReturns } from './returns'
import { nosingsOf, stairUnder } from './stair'
import { cutSticks } from './sticks'
import { layTopLine, type TopLine } from './top-line'
import type { HandrailInputs, HandrailOutputs, RailJoint, RailPart, RailWarning } from './types'
import { awkwardMarks, fieldBracketWarnings, railWarnings, wideGaps } from './warnings'
import { weldRail } from './weld'

/** The reader's tape (denominator of an inch) and dial (degrees). Only saw readings are rounded here. */
export interface RailPrecision {
  tape: number
  dial: number
}

/** Where the level runs begin, from their nosings; `null` at an end without one. */
function knucklesOf({ bottom, top }: HandrailInputs, { points, flights }: TopLine): HandrailOutputs['knuckles'] {
  const highest = points.at(-2)
  const lowest = points[1]
  const topNosing = flights.at(-1)?.topNosing
  return {
    fromTopNosing: top.type === 'level' && highest && topNosing ? highest.x - topNosing.x : null,
    fromBottomNosing: bottom.type === 'level' && lowest ? lowest.x : null,
  }
}

function bracketsOf(
  { brackets, section }: HandrailInputs,
  parts: readonly RailPart[],
): { placed?: HandrailOutputs['brackets']; warnings: RailWarning[] } {
  if (!brackets) return { warnings: [] }
  if ('field' in brackets) {
    const placed = placeFieldBrackets(parts, brackets, section.depth)
    return { placed, warnings: fieldBracketWarnings(placed) }
  }
  const placed = spaceBrackets(parts, brackets, section.depth)
  return { placed, warnings: [...wideGaps(parts, placed, brackets), ...awkwardMarks(parts, placed)] }
}

const checksOf = (
  field: HandrailInputs,
  line: TopLine,
  knuckles: HandrailOutputs['knuckles'],
): CodeRow[] | undefined => (field.code ? judgeRail(field, field.code, line, knuckles) : undefined)

/**
 * Everything to cut for one rail from its field measure, or the measure that is in the way.
 * Inches and degrees, unrounded but for saw readings. `brackets`, `stock`, `weld` and `checks` are left out of the
 * answer when they were not asked for; `stock` is null when a piece is longer than the stick, with a warning.
 */
export function solveHandrail(field: HandrailInputs, precision: RailPrecision): HandrailOutputs | Refusal {
  const fault = inputFault(field)
  if (fault) return fault
  const line = layTopLine(field)
  if (isRefusal(line)) return line
  const { section, hand } = field
  const cuts = jointsOf(line, section.depth, precision.dial)
  const parts = cutParts(field, line, cuts, precision.dial)
  if (isRefusal(parts)) return parts
  const round = section.shape === 'round'
  const joints: RailJoint[] = cuts.map((cut) => ({
    ...cut,
    perimeter: weldAround(round, section.depth, section.width, cut.miter),
  }))
  const returns = cutReturns(field, parts)
  if (isRefusal(returns)) return returns
  const stock = field.stock ? cutSticks(field.stock, section, parts, returns) : undefined
  if (isRefusal(stock)) return stock
  const weld = field.weld ? weldRail(field.weld, joints, returns) : undefined
  if (isRefusal(weld)) return weld
  const brackets = bracketsOf(field, parts)
  const closing = closeFlights(field.flights)
  const knuckles = knucklesOf(field, line)
  const checks = checksOf(field, line, knuckles)
  const [low, high] = [line.points[0], line.points.at(-1)]
  return {
    hand,
    pitches: line.flights.map(({ pitch }) => pitch),
    parts,
    joints,
    returns,
    ...(brackets.placed ? { brackets: brackets.placed } : {}),
    ...(stock ? { stock: stock.sticks } : {}),
    ...(weld ? { weld } : {}),
    ...(checks ? { checks } : {}),
    knuckles,
    closing,
    topLine: line.points,
    nosings: line.flights.map(nosingsOf),
    stair: stairUnder(field, line.flights, low?.x ?? 0, high?.x ?? 0),
    warnings: [...railWarnings(field, parts, joints, closing), ...(stock?.warnings ?? []), ...brackets.warnings],
  }
}
