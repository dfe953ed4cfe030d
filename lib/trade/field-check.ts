import { asinDeg, atanDeg, sinDeg } from './angles'
import { positive } from './checks'
import { firstRefusal, refuse, type Refusal } from './refusal'
import { atMost } from './tolerance'

export type ClosingVerdict = 'agree' | 'trust the tape, re-read the angle finder' | 'measure again'

/** What rise, run and rake may miss by, in inches; kept for a longer rake too, where it is the stricter reading. */
const closingAllowed = 1 / 8
/** What the angle finder may stand off the tape, in degrees. */
const finderAllowed = 1 / 2

/** How far a taped rake misses its rise and run: + when the rake reads short. Inches. */
export const closingError = (rise: number, run: number, rake: number) => Math.hypot(rise, run) - rake

/** Whether the tapes close, and whether the angle finder agrees with them. Without a finder, leave its error out. */
export function closingVerdict(closing: number, finder = 0): ClosingVerdict {
  if (!atMost(Math.abs(closing), closingAllowed)) return 'measure again'
  return atMost(Math.abs(finder), finderAllowed) ? 'agree' : 'trust the tape, re-read the angle finder'
}

export interface FieldCheckAnswer {
  pitchFromTape: number
  pitchFromRiseRake: number
  closingError: number
  angleFinderError: number
  /** How far the rail would stand off at its far end; + when the finder reads steep. */
  driftAtEnd: number
  verdict: ClosingVerdict
}

/** Three tapes of one flight against each other and against the angle finder. Inches and degrees. */
export function fieldCheck(given: {
  rise: number
  run: number
  rake: number
  angleFinder: number
}): FieldCheckAnswer | Refusal {
  const { rise, run, rake, angleFinder } = given
  const fault = firstRefusal([
    positive('rise', rise, 'The rise'),
    positive('run', run, 'The run'),
    positive('rake', rake, 'The rake'),
    rake > rise ? null : refuse('rake', 'The rake must be longer than its rise.'),
  ])
  if (fault) return fault
  const pitchFromTape = atanDeg(rise, run)
  const angleFinderError = angleFinder - pitchFromTape
  const closing = closingError(rise, run, rake)
  return {
    pitchFromTape,
    pitchFromRiseRake: asinDeg(rise / rake),
    closingError: closing,
    angleFinderError,
    driftAtEnd: rake * sinDeg(angleFinderError),
    verdict: closingVerdict(closing, angleFinderError),
  }
}
