import { isRefusal, refuse, type Refusal } from '../refusal'
import { wallReturn } from '../wall-return'
import { weldAround } from '../weld-length'
import type { HandrailInputs, RailPart, RailReturn } from './types'

/** The pieces that turn the rail to the wall, bottom first. */
export function cutReturns(
  { hand, section, bottom, top }: HandrailInputs,
  parts: readonly RailPart[],
): RailReturn[] | Refusal {
  const returns: RailReturn[] = []
  const ends = [
    { end: 'bottom' as const, given: bottom.return, part: parts[0] },
    { end: 'top' as const, given: top.return, part: parts.at(-1) },
  ]
  for (const { end, given, part } of ends) {
    if (!given || !part) continue
    const piece = wallReturn({ outside: section.width, clearance: given.clearance, gap: given.gap })
    if (isRefusal(piece)) return refuse(`${end}.return.${piece.field}`, piece.message)
    const { longPoint, centre, shortPoint, miter } = piece
    // Cut in plan, the miter lengthens the width of the section.
    const weld = weldAround(section.shape === 'round', section.width, section.depth, miter)
    const turns = hand === 'R' ? 'right' : 'left'
    returns.push({ end, longPoint, centre, shortPoint, rolledWithRake: part.slope, weld, turns })
  }
  return returns
}
