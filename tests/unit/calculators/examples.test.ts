import { describe, expect, it } from 'vitest'
import { computeCalculator } from '@/lib/calculators/compute'
import { calculatorIds } from '@/lib/calculators/load'
import { examplesOf, expectWithin } from '../../support/examples'

/** Ids of the code rows that fail, as the examples list them. */
function failedChecks(outputs: Record<string, unknown>): string[] | undefined {
  const { checks } = outputs as { checks?: { id: string; ok: boolean | null }[] }
  return checks?.filter(({ ok }) => ok === false).map(({ id }) => id)
}

describe.each(calculatorIds)('worked examples of %s', (id) => {
  it.each(examplesOf(id).map((example) => [example.id, example] as const))('%s', async (_name, example) => {
    const computed = await computeCalculator(example.calculator, example.inputs)
    if (!computed.ok) throw new Error(JSON.stringify(computed.errors))
    const { outputs } = computed.answer
    expectWithin({ ...outputs, failedChecks: failedChecks(outputs) }, example.expected, example.tolerance.abs)
    expect(computed.answer.text).toBeTypeOf('object')
  })
})
