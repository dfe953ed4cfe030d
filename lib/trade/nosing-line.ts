import { atanDeg } from './angles'
import { positive } from './checks'
import { firstRefusal, refuse, type Refusal } from './refusal'

export interface NosingLine {
  pitch: number
  unitRake: number
  rakeNosingToNosing: number
  runNosingToNosing: number
  riseNosingToNosing: number
  totalRise: number
}

/** Nosing line of a flight counted in risers: so many risers make one step of rake less. Inches. */
export function nosingLine(given: { risers: number; rise: number; run: number }): NosingLine | Refusal {
  const { risers, rise, run } = given
  const fault = firstRefusal([
    Number.isInteger(risers) && risers >= 2
      ? null
      : refuse('risers', 'Count 2 risers or more, in whole numbers: fewer make no nosing line.'),
    positive('rise', rise, 'The rise'),
    positive('run', run, 'The run'),
  ])
  if (fault) return fault
  const steps = risers - 1
  const unitRake = Math.hypot(rise, run)
  return {
    pitch: atanDeg(rise, run),
    unitRake,
    rakeNosingToNosing: steps * unitRake,
    runNosingToNosing: steps * run,
    riseNosingToNosing: steps * rise,
    totalRise: risers * rise,
  }
}
