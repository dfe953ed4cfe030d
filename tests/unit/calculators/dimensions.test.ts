import fc from 'fast-check'
import { all, create, type Unit } from 'mathjs'
import { describe, expect, it } from 'vitest'
import type { AnyCalculator, Values } from '@/lib/calculators/define'
import { defaultPrecision } from '@/lib/calculators/fields'
import { calculatorIds, loadCalculator } from '@/lib/calculators/load'
import { shownFor } from '@/lib/calculators/working'
import { isRefusal } from '@/lib/trade/refusal'
import { valuesOf } from '../../support/arbitrary'

const math = create(all ?? {})
const isUnit = (x: unknown): x is Unit => math.isUnit(x)
const inDegrees = (radians: number) => math.unit(radians * (180 / Math.PI), 'deg')
const toRadians = (x: Unit) => x.toNumber('rad')
const ownUnit = (x: Unit) => (x.hasBase('LENGTH') ? 'in' : 'deg')

// Trig takes an angle and nothing else: a length or a bare number in it is a fault of the formula.
math.import(
  {
    sin: (x: Unit) => Math.sin(toRadians(x)),
    cos: (x: Unit) => Math.cos(toRadians(x)),
    tan: (x: Unit) => Math.tan(toRadians(x)),
    asin: (x: number) => inDegrees(Math.asin(x)),
    acos: (x: number) => inDegrees(Math.acos(x)),
    atan: (x: number) => inDegrees(Math.atan(x)),
    sign: (x: Unit | number) => (isUnit(x) ? Math.sign(x.toNumber(ownUnit(x))) : Math.sign(x)),
    round: (x: Unit | number) =>
      isUnit(x) ? math.unit(Math.round(x.toNumber(ownUnit(x))), ownUnit(x)) : Math.round(x),
  },
  { override: true },
)

const units: Record<string, string> = { in: 'in', mm: 'in', deg: 'deg' }
const dimensionOf = (unit: string) => (unit in units ? units[unit] : 'none')

function scopeOf(calculator: AnyCalculator, given: Values): Values {
  return Object.fromEntries(
    Object.entries(calculator.inputs).map(([name, field]) => {
      const value = given[name]
      const unit = field.kind === 'quantity' ? units[field.unit] : undefined
      // Right angles have numbers for their trig like any other; the degree sign of 180 in a sum is the formula's own.
      return [name, typeof value === 'number' && unit ? math.unit(value, unit) : value]
    }),
  )
}

/** Half turns and right angles stand as bare numbers in the formulas that people read. */
const withDegrees = (formula: string) => formula.replace(/\b(180|90)\b/g, 'unit($1, "deg")')

function check(calculator: AnyCalculator, given: Values, solved: Values): void {
  const scope: Values = scopeOf(calculator, given)
  for (const [name, output] of Object.entries(calculator.outputs)) {
    const value = solved[name]
    if (output.kind !== 'value' || typeof value !== 'number' || name in scope) continue
    const unit = units[output.unit]
    scope[name] = unit ? math.unit(value, unit) : value
  }
  for (const [name, { formula }] of Object.entries(shownFor(calculator, given, solved))) {
    const value: unknown = math.evaluate(withDegrees(formula), scope)
    const output = calculator.outputs[name]
    const wanted = output?.kind === 'value' ? dimensionOf(output.unit) : 'none'
    const found = isUnit(value) ? (value.hasBase('LENGTH') ? 'in' : 'deg') : 'none'
    expect(found, `${name} = ${formula}`).toBe(wanted)
    scope[name] = value
  }
}

describe.each(calculatorIds)('%s', (id) => {
  it('shows formulas whose dimensions agree', async () => {
    const calculator = await loadCalculator(id)
    if (!calculator.shown) return expect(calculator.steps).toBeTypeOf('function')
    let checked = 0
    fc.assert(
      fc.property(valuesOf(calculator), (given) => {
        const solved = calculator.solve(given, defaultPrecision)
        if (isRefusal(solved)) return
        checked++
        check(calculator, given, solved)
      }),
      { numRuns: 30 },
    )
    expect(checked).toBeGreaterThan(3)
  })
})
