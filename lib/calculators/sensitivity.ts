import { isRefusal } from '@/lib/trade/refusal'
import type { AnyCalculator, Values } from './define'
import type { Field, Precision } from './fields'

/** What being a little off in one input does to the answer. */
export interface Effect {
  input: string
  label: string
  /** The amount off, in the input's unit: 1/16 in, 1/2°, 1/8 in per ft. */
  off: number
  unit: 'in' | 'deg' | 'in/ft'
  /** The larger change of the answer, in its own unit, of being off either way. */
  change: number
}

const slip = { in: 1 / 16, deg: 0.5, 'in/ft': 1 / 8 } as const

const slippery = (field: Field): keyof typeof slip | undefined =>
  field.kind === 'quantity' && field.unit in slip ? (field.unit as keyof typeof slip) : undefined

/** Each measured input's effect on the main answer, by differences of solve, the largest first. */
export function sensitivityOf(calculator: AnyCalculator, given: Values, precision: Precision): Effect[] {
  const target = calculator.exactAnswer ?? calculator.answer
  const at = (inputs: Values): number | undefined => {
    const solved = calculator.solve(inputs, precision)
    const value = isRefusal(solved) ? undefined : solved[target]
    return typeof value === 'number' ? value : undefined
  }
  const here = at(given)
  if (here === undefined) return []
  return Object.entries(calculator.inputs)
    .flatMap(([input, field]): Effect[] => {
      const unit = slippery(field)
      const value = given[input]
      if (!unit || typeof value !== 'number') return []
      const moved = [value - slip[unit], value + slip[unit]].map((x) => at({ ...given, [input]: x }))
      const changes = moved.filter((x) => x !== undefined).map((x) => Math.abs(x - here))
      return changes.length === 0
        ? []
        : [{ input, label: field.label, off: slip[unit], unit, change: Math.max(...changes) }]
    })
    .sort((a, b) => b.change - a.change)
}
