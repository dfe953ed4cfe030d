import { solveHandrail } from '@/lib/trade/rail/solve'
import type { HandrailInputs, HandrailOutputs } from '@/lib/trade/rail/types'
import { isRefusal, type Refusal } from '@/lib/trade/refusal'

/** A flight of 3 in 4: its rake is 10 in a step, an inch of height moves a knuckle 4/3 in. Numbers come out by hand. */
export const plainRail: HandrailInputs = {
  hand: 'R',
  section: { shape: 'square', depth: 1.5, width: 1.5 },
  railHeight: 36,
  flights: [{ risers: 11, rise: 6, run: 8 }],
  bottom: { type: 'none' },
  top: { type: 'none' },
}

const precision = { tape: 16, dial: 0.25 }

/** Solves the plain rail with some inputs changed. Throws when it is refused. */
export function solved(change: Partial<HandrailInputs> = {}): HandrailOutputs {
  const answer = solveHandrail({ ...plainRail, ...change }, precision)
  if (isRefusal(answer)) throw new Error(`${answer.field}: ${answer.message}`)
  return answer
}

/** The refusal of the plain rail with some inputs changed. Throws when it is answered. */
export function refused(change: Partial<HandrailInputs>): Refusal {
  const answer = solveHandrail({ ...plainRail, ...change }, precision)
  if (!isRefusal(answer)) throw new Error('Answered, not refused')
  return answer
}
