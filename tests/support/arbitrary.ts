import fc from 'fast-check'
import type { AnyCalculator, Values } from '@/lib/calculators/define'
import type { Field, Fields } from '@/lib/calculators/fields'
import { railFields } from './rail-fields'

/** Where inputs must fit each other to make sense, random ones are drawn together. */
const drawnTogether: Record<string, fc.Arbitrary<Values>> = { handrail: railFields.map((field) => ({ ...field })) }

/** Random input for a calculator that mostly gets an answer. */
export const givenFor = (calculator: AnyCalculator): fc.Arbitrary<Values> =>
  drawnTogether[calculator.id] ?? valuesOf(calculator)

/** Random values as solve receives them: within the usual range of each field, or its hard ends where no usual one stands. */
export const valuesOf = ({ inputs }: Pick<AnyCalculator, 'inputs'>): fc.Arbitrary<Values> => fields(inputs)

function fields(of: Fields): fc.Arbitrary<Values> {
  return fc.record(Object.fromEntries(Object.entries(of).map(([name, field]) => [name, value(field)])))
}

function value(field: Field): fc.Arbitrary<unknown> {
  const given = bare(field)
  return field.fallback === null ? fc.option(given, { nil: null, freq: 3 }) : given
}

function bare(field: Field): fc.Arbitrary<unknown> {
  switch (field.kind) {
    case 'quantity':
      return between(field)
    case 'whole':
      return fc.integer({
        min: Math.ceil(field.sane?.[0] ?? field.least ?? 0),
        max: Math.floor(field.sane?.[1] ?? field.most ?? 50),
      })
    case 'choice':
      return fc.constantFrom(...field.options)
    case 'list':
      return fc.array(value(field.of), { minLength: field.least, maxLength: Math.min(field.most, field.least + 6) })
    case 'group':
      return fields(field.fields)
    case 'forms':
      return fc.oneof(...field.forms.map(fields))
  }
}

/** A length with no usual range is one that shops cut: up to 20 ft. */
function between({ sane, least, above, most }: Extract<Field, { kind: 'quantity' }>): fc.Arbitrary<number> {
  const low = sane?.[0] ?? Math.max(least ?? -1e3, (above ?? -1e3) + 1e-3)
  const high = sane?.[1] ?? Math.min(most ?? 240, 240)
  return fc.double({ min: low, max: high, noNaN: true, noDefaultInfinity: true })
}

/** Every input as absent, hostile or merely odd things that JSON can hold. */
export const hostileOf = ({ inputs }: Pick<AnyCalculator, 'inputs'>): fc.Arbitrary<unknown> =>
  fc.record(Object.fromEntries(Object.keys(inputs).map((name) => [name, odd])), { requiredKeys: [] })

const odd = fc.oneof(
  fc.constantFrom(
    null,
    '',
    '0',
    '-1',
    '1e400',
    'NaN',
    '3′-0¼″',
    '1,5',
    '5\' 14"',
    '__proto__',
    '<b>',
    0,
    -0,
    1e308,
    -1e308,
    5e-324,
    true,
    [],
    {},
  ),
  fc.double(),
  fc.string({ maxLength: 80 }),
  fc.array(fc.oneof(fc.double(), fc.string(), fc.object()), { maxLength: 5 }),
  fc.object(),
)
