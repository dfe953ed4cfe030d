import { answer, type Answered } from './answer'
import { defaultPrecision, type Precision } from './fields'
import { isCalculatorId, loadCalculator } from './load'
import type { Fault } from './read'

const tapes: readonly number[] = [8, 16, 32, 64]
const dials: readonly number[] = [0.25, 0.5, 1]

/** Reads the reader's tape and dial; left out, 1/16 in and 1/4°. */
export function readPrecision(asked: { tape?: number; dial?: number } = {}): Precision | Fault[] {
  const { tape = defaultPrecision.tape, dial = defaultPrecision.dial } = asked
  const faults: Fault[] = []
  if (!tapes.includes(tape))
    faults.push({ field: 'precision.tape', message: `The tape is one of ${tapes.join(', ')}.` })
  if (!dials.includes(dial))
    faults.push({ field: 'precision.dial', message: `The dial is one of ${dials.join(', ')}.` })
  return faults.length > 0 ? faults : ({ tape, dial } as Precision)
}

/**
 * Computes a calculator by its id, for whatever is stored, judged or sent over the wire.
 * @throws RangeError when there is no calculator of that id.
 */
export async function computeCalculator(
  id: string,
  inputs: unknown,
  asked?: { tape?: number; dial?: number },
): Promise<Answered> {
  if (!isCalculatorId(id)) throw new RangeError(`No calculator is called ${id}`)
  const precision = readPrecision(asked)
  if (Array.isArray(precision)) return { ok: false, errors: precision }
  return answer(await loadCalculator(id), inputs, precision)
}
