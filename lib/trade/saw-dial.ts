import { toDial } from './angles'
import { positive } from './checks'
import { firstRefusal, refuse, type Refusal } from './refusal'
import { atMost } from './tolerance'

export interface SawDialAnswer {
  squareIs0: number
  squareIs90: number
  overRange: boolean
  /** Setting with the stock laid 90° to the fence on a squared block; `null` when the saw reaches the cut. */
  ifOverRange: number | null
}

/** What a saw reads for a cut so many degrees off square, on either scale. */
export function sawDial(given: { fromSquare: number; sawMax: number; step: number }): SawDialAnswer | Refusal {
  const { fromSquare, sawMax, step } = given
  const fault = firstRefusal([
    fromSquare >= 0 && fromSquare <= 90 ? null : refuse('fromSquare', 'A cut lies between 0° and 90° off square.'),
    sawMax > 0 && sawMax <= 90 ? null : refuse('sawMax', 'A saw swings between 0° and 90°.'),
    positive('step', step, 'The step of the dial'),
  ])
  if (fault) return fault
  const squareIs0 = toDial(fromSquare, step)
  const overRange = !atMost(fromSquare, sawMax)
  return {
    squareIs0,
    squareIs90: 90 - squareIs0,
    overRange,
    ifOverRange: overRange ? toDial(90 - fromSquare, step) : null,
  }
}
