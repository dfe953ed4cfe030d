import type { Field, Fields, Precision } from '@/lib/calculators/fields'
import type { Values } from '@/lib/calculators/define'
import { unitSuffix } from '@/lib/calculators/text'
import type { Line, List } from './sheet'

type Row = List['rows'][number]

/** What was given, a row an input, as it was understood; what was left out is not named. */
export function givenRows(fields: Fields, inputs: Values, precision: Precision, under = ''): Row[] {
  return Object.entries(fields).flatMap(([name, field]) => {
    const value = inputs[name]
    if (value === undefined || value === null) return []
    return rowsOf(field, value, precision, under ? `${under}, ${field.label.toLowerCase()}` : field.label)
  })
}

function rowsOf(field: Field, value: unknown, precision: Precision, name: string): Row[] {
  switch (field.kind) {
    case 'group':
      return givenRows(field.fields, value as Values, precision, name)
    case 'forms': {
      const given = value as Values
      const form = field.forms.find((fields) => Object.keys(given).every((key) => key in fields))
      return form ? givenRows(form, given, precision, name) : []
    }
    case 'list':
      return listRows(field.of, value as readonly unknown[], precision, name)
    default:
      return [{ name, line: pieceOf(field, value, precision) }]
  }
}

/** Plain values stand in one row, sets in rows of their own. */
function listRows(of: Field, values: readonly unknown[], precision: Precision, name: string): Row[] {
  if (of.kind === 'group' || of.kind === 'forms' || of.kind === 'list')
    return values.flatMap((value, i) => rowsOf(of, value, precision, `${of.label} ${i + 1}`))
  const line = values.flatMap((value, i): Line => [...(i > 0 ? [' · '] : []), ...pieceOf(of, value, precision)])
  return [{ name, line }]
}

function pieceOf(field: Field, value: unknown, { tape }: Precision): Line {
  if (field.kind === 'choice') {
    const at = field.options.findIndex((option) => option === value)
    return [{ strong: field.names?.[at] ?? String(value) }]
  }
  if (typeof value !== 'number') return [{ strong: String(value) }]
  const unit = 'unit' in field ? field.unit : 'none'
  // Rounded to the tape a decimal would not be what was given.
  const onTape = unit === 'in' && Math.abs(value * tape - Math.round(value * tape)) < 1e-6
  return [onTape ? { tape: value } : { strong: `${Number(value.toFixed(4))}${unitSuffix[unit] ?? ''}` }]
}
