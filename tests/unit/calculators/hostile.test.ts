import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { answer } from '@/lib/calculators/answer'
import { defaultPrecision } from '@/lib/calculators/fields'
import { calculatorIds, loadCalculator } from '@/lib/calculators/load'
import { sensitivityOf } from '@/lib/calculators/sensitivity'
import { givenFor, hostileOf } from '../../support/arbitrary'

const runs = process.env.LONGPOINT_FULL ? 500 : 50

/** Paths of numbers that are not finite, and of texts that say so. */
function unsound(value: unknown, path = ''): string[] {
  if (typeof value === 'number') return Number.isFinite(value) ? [] : [path]
  if (typeof value === 'string') return /\b(?:NaN|Infinity|undefined|null)\b/.test(value) ? [`${path}: ${value}`] : []
  if (typeof value !== 'object' || value === null) return []
  return Object.entries(value).flatMap(([name, of]) => unsound(of, `${path}.${name}`))
}

describe.each(calculatorIds)('%s', (id) => {
  it('answers odd input with a sentence for a named field, or with finite numbers', async () => {
    const calculator = await loadCalculator(id)
    fc.assert(
      fc.property(fc.oneof(hostileOf(calculator), fc.anything()), (raw) => {
        const answered = answer(calculator, raw, defaultPrecision)
        if (answered.ok) {
          const { outputs, text, steps } = answered.answer
          expect(unsound({ outputs, text, steps })).toEqual([])
          return
        }
        expect(answered.errors.length).toBeGreaterThan(0)
        for (const { field, message } of answered.errors) {
          expect(field).not.toBe('')
          expect(message).toMatch(/\S.*\.$/)
        }
      }),
      { numRuns: runs },
    )
  })

  it('answers random valid input with finite numbers, text and effects', async () => {
    const calculator = await loadCalculator(id)
    let answered = 0
    fc.assert(
      fc.property(givenFor(calculator), (given) => {
        const solved = answer(calculator, given, defaultPrecision)
        if (!solved.ok) return
        answered++
        const { inputs, outputs, text, steps } = solved.answer
        expect(unsound({ outputs, text, steps })).toEqual([])
        expect(unsound(sensitivityOf(calculator, inputs, defaultPrecision))).toEqual([])
      }),
      { numRuns: runs * 4 },
    )
    expect(answered).toBeGreaterThan(runs / 10)
  })
})
