import type { AnyCalculator, Shown, Step, Values } from './define'
import type { Precision } from './fields'
import type { Output } from './outputs'

/** The entry's formulas for these very numbers (an entry may show another set where it branches). */
export function shownFor(calculator: Pick<AnyCalculator, 'shown'>, given: Values, solved: Values): Shown {
  const { shown } = calculator
  return typeof shown === 'function' ? shown(given, solved) : (shown ?? {})
}

/** The working: each shown formula, the same with its numbers, and its value; then the steps no formula can say. */
export function workingOf(calculator: AnyCalculator, given: Values, solved: Values, precision: Precision): Step[] {
  const known: Values = { ...given, ...solved }
  const formulas = Object.entries(shownFor(calculator, given, solved)).map(([name, { says, formula }]) => ({
    says,
    formula: `${name} = ${formula}`,
    substituted: substitute(formula, known),
    value: plain(known[name], calculator.outputs[name]),
  }))
  return [...formulas, ...(calculator.steps?.(given, solved, precision) ?? [])]
}

/** The formula with numbers in the place of names; names that hold no number stay. */
export function substitute(formula: string, known: Values): string {
  return formula.replace(/[A-Za-z_][A-Za-z0-9_]*(?!\s*\()/g, (name) => {
    const value = known[name]
    if (typeof value !== 'number') return name
    const digits = String(Number(value.toPrecision(7)))
    return value < 0 ? `(${digits})` : digits
  })
}

function plain(value: unknown, output: Output | undefined): string {
  if (typeof value !== 'number') return String(value ?? '')
  const digits = String(Number(value.toFixed(4)))
  const unit = output?.kind === 'value' ? output.unit : 'none'
  if (unit === 'deg') return `${digits}°`
  return unit === 'none' || unit === 'text' || unit === 'flag' ? digits : `${digits} ${unit}`
}
