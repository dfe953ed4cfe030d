import 'server-only'
import { computeCalculator } from '@/lib/calculators/compute'
import { Unfit } from '@/lib/errors'
import type { NewSheet } from '@/lib/schemas/job'
import type { SheetAnswer } from '@/lib/schemas/views'

type Numbers = Pick<NewSheet, 'calculator' | 'inputs' | 'precision'>

/**
 * What is kept of a sheet's numbers: computed here, whatever the browser had on its screen.
 * @throws Unfit naming `calculator`, or the input that cannot be taken, as `inputs.slopeBelow`.
 */
export async function computeSheet({ calculator, inputs, precision }: Numbers) {
  const computed = await computeCalculator(calculator, inputs, precisionOf(precision)).catch(refuseUnknown)
  if (!computed.ok) throw new Unfit(computed.errors.map(({ field, message }) => ({ field: placeOf(field), message })))
  const results: SheetAnswer = computed.answer
  return { calculator, calculatorRevision: results.revision, inputs: results.inputs, results }
}

const placeOf = (field: string) => (field.startsWith('precision.') ? field : `inputs.${field}`)

function precisionOf({ tape, dial }: NonNullable<Numbers['precision']> = {}) {
  return { ...(tape === undefined ? {} : { tape }), ...(dial === undefined ? {} : { dial }) }
}

function refuseUnknown(error: unknown): never {
  if (!(error instanceof RangeError)) throw error
  throw new Unfit([{ field: 'calculator', message: 'There is no calculator of that name.' }])
}
