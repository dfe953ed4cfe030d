import { consumables } from '../consumables'
import { isRefusal, refuse, type Refusal } from '../refusal'
import type { HandrailOutputs, RailJoint, RailReturn, WeldGiven } from './types'

/** Weld of every joint and return, and the filler and time it takes. */
export function weldRail(
  weld: WeldGiven,
  joints: readonly RailJoint[],
  returns: readonly RailReturn[],
): NonNullable<HandrailOutputs['weld']> | Refusal {
  const { areaIn2, efficiency, lbPerHour, arcOnPct } = weld
  const lengthIn = [...joints.map(({ perimeter }) => perimeter), ...returns.map((piece) => piece.weld)].reduce(
    (a, b) => a + b,
    0,
  )
  const needed = consumables({ areaIn2, lengthIn, efficiency, lbPerHour, arcOnPct: arcOnPct ?? 25 })
  return isRefusal(needed) ? refuse(`weld.${needed.field}`, needed.message) : { lengthIn, ...needed }
}
