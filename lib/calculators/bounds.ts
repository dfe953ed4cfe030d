import type { QuantityField, Unit, WholeField } from './fields'

const unitWords: Partial<Record<Unit, string>> = {
  deg: '°',
  in: ' in',
  'in/ft': ' in per ft',
  '%': ' %',
  mm: ' mm',
  lb: ' lb',
}

const withUnit = (value: number, unit: Unit) => `${Number(value.toPrecision(6))}${unitWords[unit] ?? ''}`

type Numeric = QuantityField | WholeField

/** The sentence for a number the maths cannot take, or nothing. */
export function outOfBounds(field: Numeric, value: number): string | undefined {
  const { label, unit, above, least, most } = field
  if (!Number.isFinite(value)) return `${label}: that number is too large to work with.`
  if (field.kind === 'whole' && !Number.isInteger(value)) return `${label}: give a whole number.`
  if (above !== undefined && value <= above) return `${label} must be more than ${withUnit(above, unit)}.`
  if (least !== undefined && value < least) return `${label} must be at least ${withUnit(least, unit)}.`
  if (most !== undefined && value > most) return `${label} can be at most ${withUnit(most, unit)}.`
  return undefined
}

/** The sentence for a number outside the usual range, or nothing: a warning, never a refusal. */
export function outOfRange(field: Numeric, value: number): string | undefined {
  if (!field.sane) return undefined
  const [low, high] = field.sane
  if (value >= low && value <= high) return undefined
  return `${field.label}: ${withUnit(value, field.unit)} is outside the usual ${withUnit(low, field.unit)} to ${withUnit(high, field.unit)}. Check the reading.`
}
