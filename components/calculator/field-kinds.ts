import type { ChoiceField, Field, Fields, Precision, QuantityField, WholeField } from '@/lib/calculators/fields'
import type { RawInputs } from './address'

export type NumberField = QuantityField | WholeField

export const isNumber = (field: Field): field is NumberField => field.kind === 'quantity' || field.kind === 'whole'

/** Inputs to show at once, and those that may be left as they are: with a fallback, and not in the example. */
export function splitFields(fields: Fields, example: RawInputs): { main: [string, Field][]; more: [string, Field][] } {
  const canWait = ([name, field]: [string, Field]) => field.fallback !== undefined && example[name] === undefined
  const all = Object.entries(fields)
  return { main: all.filter((entry) => !canWait(entry)), more: all.filter(canWait) }
}

/** What stands when this input is left out, as text. */
export function fallbackText(field: Field, precision: Precision): string | undefined {
  const { fallback } = field
  if (fallback === undefined || fallback === null) return undefined
  return String(typeof fallback === 'function' ? fallback(precision) : fallback)
}

/** The options of a choice with the names a person reads. */
export const optionsOf = ({ options, names }: ChoiceField) =>
  options.map((option, i) => ({ value: String(option), name: names?.[i] ?? String(option) }))

/** Typed text of one input; anything else than text or number is none. */
export const textOfRaw = (value: unknown): string =>
  typeof value === 'string' || typeof value === 'number' ? String(value) : ''
