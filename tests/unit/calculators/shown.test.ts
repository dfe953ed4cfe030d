import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { AnyCalculator, Values } from '@/lib/calculators/define'
import { defaultPrecision } from '@/lib/calculators/fields'
import { calculatorIds, loadCalculator } from '@/lib/calculators/load'
import { shownFor } from '@/lib/calculators/working'
import { isRefusal } from '@/lib/trade/refusal'
import { valuesOf } from '../../support/arbitrary'
import { degreesMath } from '../../support/degrees-math'

const math = degreesMath()

/** Every shown formula beside what solve gave for it, for one set of numbers. */
function compare(calculator: AnyCalculator, given: Values, solved: Values): void {
  const scope: Values = { ...given }
  for (const [name, { formula }] of Object.entries(shownFor(calculator, given, solved))) {
    // Names that solve gives but no formula shows may be used as they are.
    const value = Number(math.evaluate(formula, { ...solved, ...scope }))
    const expected = solved[name] ?? scope[name]
    expect(expected, `${calculator.id}.${name} is an output`).toBeTypeOf('number')
    const allowed = 1e-9 * Math.max(1, Math.abs(value))
    expect(Math.abs(value - Number(expected)), `${name} = ${formula}`).toBeLessThanOrEqual(allowed)
    scope[name] = value
  }
}

describe.each(calculatorIds)('%s', (id) => {
  it('shows the working that solve does', async () => {
    const calculator = await loadCalculator(id)
    if (!calculator.shown) {
      // No formula can say what it does: then it says its steps.
      expect(calculator.steps).toBeTypeOf('function')
      return
    }
    let answered = 0
    fc.assert(
      fc.property(valuesOf(calculator), (given) => {
        const solved = calculator.solve(given, defaultPrecision)
        if (isRefusal(solved)) return
        answered++
        compare(calculator, given, solved)
      }),
      { numRuns: 400 },
    )
    // Always refused would prove nothing.
    expect(answered).toBeGreaterThan(50)
  })
})
