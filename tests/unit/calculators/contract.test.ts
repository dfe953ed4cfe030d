import { describe, expect, it } from 'vitest'
import type { AnyCalculator } from '@/lib/calculators/define'
import { calculatorIds, isCalculatorId, loadCalculator } from '@/lib/calculators/load'
import contract from '../../support/contract.json'

interface Promised {
  id: string
  stage: string
  inputs: Record<string, unknown>
  outputs: Record<string, unknown>
  optional?: unknown
}
const promised = contract.calculators as unknown as Promised[]

/** Names that the contract lets a caller leave out. */
const optionalNames = ({ optional, inputs }: Promised) =>
  typeof optional === 'object' && optional !== null ? Object.keys(optional) : Object.keys(inputs)

/** Outputs that solve gives for the entry's own example. */
async function outputsOf(calculator: AnyCalculator) {
  const { computeCalculator } = await import('@/lib/calculators/compute')
  const computed = await computeCalculator(calculator.id, calculator.example)
  if (!computed.ok) throw new Error(`${calculator.id}: its own example is refused: ${JSON.stringify(computed.errors)}`)
  return computed.answer
}

describe.each(promised.filter(({ id }) => isCalculatorId(id)).map((entry) => [entry.id, entry] as const))(
  '%s',
  (id, entry) => {
    it('takes the names of the contract and no others', async () => {
      const calculator = await loadCalculator(id as (typeof calculatorIds)[number])
      expect(calculator.stage).toBe(entry.stage)
      expect(Object.keys(calculator.inputs).sort()).toEqual(Object.keys(entry.inputs).sort())
    })

    it('lets only what the contract calls optional be left out', async () => {
      const calculator = await loadCalculator(id as (typeof calculatorIds)[number])
      const optional = Object.entries(calculator.inputs).filter(([, { fallback }]) => fallback !== undefined)
      const allowed = new Set([...optionalNames(entry), 'dialStep', 'den', 'step'])
      expect(optional.map(([name]) => name).filter((name) => !allowed.has(name))).toEqual([])
    })

    it('describes every output of the contract', async () => {
      const calculator = await loadCalculator(id as (typeof calculatorIds)[number])
      expect(Object.keys(calculator.outputs)).toEqual(expect.arrayContaining(Object.keys(entry.outputs)))
    })
  },
)

describe.each(calculatorIds)('%s', (id) => {
  it('answers its own example, and puts every number of it into words', async () => {
    const calculator = await loadCalculator(id)
    const { outputs, text, steps } = await outputsOf(calculator)
    for (const [name, output] of Object.entries(calculator.outputs)) {
      if (output.kind !== 'shape' && outputs[name] !== undefined) expect(Object.keys(text)).toContain(name)
    }
    expect(steps.length).toBeGreaterThan(0)
  })

  it('describes exactly the outputs that solve gives', async () => {
    const calculator = await loadCalculator(id)
    const { outputs } = await outputsOf(calculator)
    expect(Object.keys(outputs).filter((name) => !Object.hasOwn(calculator.outputs, name))).toEqual([])
  })

  it('names real fields in its cautions and real calculators as related, and gives a source', async () => {
    const calculator = await loadCalculator(id)
    const names = [...Object.keys(calculator.inputs), ...Object.keys(calculator.outputs)]
    for (const { beside } of calculator.cautions) if (beside !== undefined) expect(names).toContain(beside)
    for (const related of calculator.related) expect(calculatorIds).toContain(related)
    expect(calculator.sources.length).toBeGreaterThan(0)
    expect([calculator.answer, ...calculator.glance].filter((name) => !names.includes(name))).toEqual([])
  })
})
