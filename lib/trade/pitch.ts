import { asinDeg, atanDeg, acosDeg, tanDeg } from './angles'
import { positive, notNegative } from './checks'
import { firstRefusal, isRefusal, refuse, type Refusal } from './refusal'

type Measured = number | null | undefined

export interface PitchAnswer {
  pitch: number
  /** Rise in 12 of run. */
  inPer12: number
  rise: number
  run: number
  rake: number
}

/** How far a third tape may stand off the other two before nobody can say which is wrong, in inches. */
const tapeAgrees = 1 / 16

function fromRiseAndRun(rise: number, run: number, rake: Measured): Omit<PitchAnswer, 'inPer12'> | Refusal {
  const solved = { pitch: atanDeg(rise, run), rise, run, rake: Math.hypot(rise, run) }
  if (rake === null || rake === undefined || Math.abs(rake - solved.rake) <= tapeAgrees) return solved
  return refuse('rake', 'The three tapes disagree by more than 1/16 in: measure again, or leave one out.')
}

function fromRake(rake: number, rise: Measured, run: Measured): Omit<PitchAnswer, 'inPer12'> | Refusal {
  if (typeof rise === 'number') {
    if (rake <= rise) return refuse('rake', 'The rake must be longer than its rise.')
    return { pitch: asinDeg(rise / rake), rise, run: Math.sqrt(rake ** 2 - rise ** 2), rake }
  }
  if (typeof run !== 'number') return refuse('rise', 'Give two of rise, run and rake.')
  if (rake < run) return refuse('rake', 'The rake cannot be shorter than its run.')
  return { pitch: acosDeg(run / rake), rise: Math.sqrt(rake ** 2 - run ** 2), run, rake }
}

/**
 * Pitch from any two of rise, run and rake; inches in, degrees and inches out.
 * Given all three, rise and run win and the rake must agree within 1/16 in, else it is refused.
 */
export function pitchFrom({
  rise,
  run,
  rake,
}: {
  rise?: Measured
  run?: Measured
  rake?: Measured
}): PitchAnswer | Refusal {
  const fault = firstRefusal([
    typeof rise === 'number' ? notNegative('rise', rise, 'The rise') : null,
    typeof run === 'number' ? positive('run', run, 'The run') : null,
    typeof rake === 'number' ? positive('rake', rake, 'The rake') : null,
  ])
  if (fault) return fault
  const solved = solvePair(rise, run, rake)
  return isRefusal(solved) ? solved : { ...solved, inPer12: 12 * tanDeg(solved.pitch) }
}

function solvePair(rise: Measured, run: Measured, rake: Measured) {
  if (typeof rise === 'number' && typeof run === 'number') return fromRiseAndRun(rise, run, rake)
  if (typeof rake === 'number') return fromRake(rake, rise, run)
  return refuse(typeof rise === 'number' ? 'run' : 'rise', 'Give two of rise, run and rake.')
}
