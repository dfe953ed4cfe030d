import { isRefusal } from '@/lib/trade/refusal'
import { solveHandrail } from '@/lib/trade/rail/solve'
import type { Precision } from '@/lib/calculators/fields'
import type { HandrailInputs, RailPart } from '@/lib/trade/rail/types'

/** A measure that was off a little, and what that does to the steel. */
export interface RailSlip {
  /** Path on the sheet: `flights[0].nosingRise`. */
  path: string
  /** What a hand is off by: 1/16 in, 1/2°, 1/8 in per ft. */
  off: keyof typeof sizes
  /** Largest change of any part's top edge, in. */
  length: number
  /** Largest change of any cut, degrees. */
  cut: number
}

const sizes = { in: 1 / 16, deg: 1 / 2, 'in/ft': 1 / 8 } as const
const flightSlips = { rise: 'in', run: 'in', rake: 'in', pitch: 'deg', nosingRise: 'in', nosingRun: 'in' } as const
const landingSlips = { length: 'in', slopeInPerFt: 'in/ft' } as const

/** Changes too small for any tape or dial. */
const unseen = 0.0005

/** Brackets and sticks change no cut: they are left out of the comparison. */
const cutsOf = (given: HandrailInputs, precision: Precision): readonly RailPart[] | null => {
  const solved = solveHandrail({ ...given, brackets: null, stock: null, weld: null, code: null }, precision)
  return isRefusal(solved) ? null : solved.parts
}

const largest = (changes: readonly number[]) => Math.max(0, ...changes.map(Math.abs))

function effect(parts: readonly RailPart[], moved: readonly RailPart[]): Pick<RailSlip, 'length' | 'cut'> {
  const pairs = parts.flatMap((part, i) => {
    const other = moved[i]
    return other ? [[part, other] as const] : []
  })
  return {
    length: largest(pairs.map(([part, other]) => other.topEdge - part.topEdge)),
    cut: largest(
      pairs.flatMap(([part, other]) => [other.endA.exact - part.endA.exact, other.endB.exact - part.endB.exact]),
    ),
  }
}

type Changed = { path: string; off: keyof typeof sizes; given: (amount: number) => HandrailInputs }

/** Every measured number of flights and landings; what a counted flight needs for its code rows alone moves nothing. */
function measuredNumbers(given: HandrailInputs): Changed[] {
  const inList = <T extends object>(
    list: 'flights' | 'landings',
    items: readonly T[],
    slips: Readonly<Record<string, keyof typeof sizes>>,
  ): Changed[] =>
    items.flatMap((item, i) =>
      Object.entries(slips).flatMap(([name, off]): Changed[] => {
        const value: unknown = (item as Record<string, unknown>)[name]
        if (typeof value !== 'number') return []
        const moved = (amount: number) => items.map((one, j) => (j === i ? { ...one, [name]: value + amount } : one))
        return [{ path: `${list}[${i}].${name}`, off, given: (amount) => ({ ...given, [list]: moved(amount) }) }]
      }),
    )
  return [...inList('flights', given.flights, flightSlips), ...inList('landings', given.landings ?? [], landingSlips)]
}

/** What a small slip of the tape or the angle finder does to lengths and cuts, the costliest first. */
export function railSlips(given: HandrailInputs, precision: Precision): RailSlip[] {
  const parts = cutsOf(given, precision)
  if (!parts) return []
  return measuredNumbers(given)
    .flatMap(({ path, off, given: changed }): RailSlip[] => {
      const effects = [-sizes[off], sizes[off]].flatMap((amount) => {
        const moved = cutsOf(changed(amount), precision)
        return moved ? [effect(parts, moved)] : []
      })
      const [length, cut] = [largest(effects.map((one) => one.length)), largest(effects.map((one) => one.cut))]
      return length < unseen && cut < unseen ? [] : [{ path, off, length, cut }]
    })
    .sort((a, b) => b.length - a.length || b.cut - a.cut)
}
