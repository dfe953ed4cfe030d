import { describe, expect, it } from 'vitest'
import { computeCalculator } from '@/lib/calculators/compute'
import type { AnyCalculator } from '@/lib/calculators/define'
import type { Field } from '@/lib/calculators/fields'
import { calculatorIds, isCalculatorId, loadCalculator } from '@/lib/calculators/load'
import type { Output } from '@/lib/calculators/outputs'
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

/** What the entry answers to its own example, without the inputs that are to be left out. */
async function answerTo(calculator: AnyCalculator, without: readonly string[] = []) {
  const given = Object.entries(calculator.example).filter(([name]) => !without.includes(name))
  const computed = await computeCalculator(calculator.id, Object.fromEntries(given))
  if (!computed.ok) throw new Error(`${calculator.id}: its own example is refused: ${JSON.stringify(computed.errors)}`)
  return computed.answer
}

/** The unit that a line of the contract names: `in, nosing to nosing`, `4-9.5 in`, `[in] overall lengths`, `bool`. */
function promisedUnit(line: unknown): string | undefined {
  const named = /(?:^|[\s[])(in\/12|in|deg|mm|%|bool)(?=$|[\s,\]])/.exec(String(line))?.[1]
  return named === 'bool' ? 'flag' : named
}

/** Units of what holds one value, or a list of such; groups and forms are spelled out by the worked examples. */
function unitOf(field: Field | Output): string | undefined {
  if (field.kind === 'list') return unitOf(field.of)
  const unit = 'unit' in field ? field.unit : undefined
  return unit === 'none' || unit === 'text' ? undefined : unit
}
const holdsValues = (field: Field | Output): boolean =>
  field.kind === 'list' ? holdsValues(field.of) : !['group', 'forms', 'shape'].includes(field.kind)

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

    it('takes and gives the units of the contract', async () => {
      const calculator = await loadCalculator(id as (typeof calculatorIds)[number])
      const told = [
        ...Object.entries(calculator.inputs).map(([name, field]) => [name, field, entry.inputs[name]] as const),
        ...Object.entries(entry.outputs).map(([name, line]) => [name, calculator.outputs[name], line] as const),
      ]
      // The contract leaves a line empty where there is no unit to name.
      const compared = told.filter(([, field, line]) => field !== undefined && holdsValues(field) && line !== '')
      expect(compared.map(([name, field]) => [name, field && unitOf(field)])).toEqual(
        compared.map(([name, , line]) => [name, promisedUnit(line)]),
      )
      expect(compared.length).toBeGreaterThan(2)
    })

    it('fills in what the contract says for what is left out', async () => {
      const calculator = await loadCalculator(id as (typeof calculatorIds)[number])
      const { optional } = entry
      if (typeof optional !== 'object' || optional === null) return
      const { inputs } = await answerTo(calculator, Object.keys(optional))
      expect(inputs).toMatchObject(optional)
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
    const { outputs, text, steps } = await answerTo(calculator)
    for (const [name, output] of Object.entries(calculator.outputs)) {
      if (output.kind !== 'shape' && outputs[name] !== undefined) expect(Object.keys(text)).toContain(name)
    }
    expect(steps.length).toBeGreaterThan(0)
  })

  it('describes exactly the outputs that solve gives', async () => {
    const calculator = await loadCalculator(id)
    const { outputs } = await answerTo(calculator)
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
