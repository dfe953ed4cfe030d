import type { Values } from '@/lib/calculators/define'
import type { Precision } from '@/lib/calculators/fields'
import type { Output, OutputValue, Outputs } from '@/lib/calculators/outputs'
import { valueText } from '@/lib/calculators/text'
import type { Line, List } from './sheet'

type Row = List['rows'][number]

/** What came out, a row an output, lengths to the tape with the exact inches small under them. */
export function foundRows(outputs: Outputs, solved: Values, precision: Precision): Row[] {
  return Object.entries(outputs).flatMap(([name, output]) => {
    const value = solved[name]
    return value === undefined || value === null ? [] : rowsOf(output, value, precision, output.label)
  })
}

function rowsOf(output: Output, value: unknown, precision: Precision, name: string): Row[] {
  switch (output.kind) {
    case 'shape':
      return []
    case 'value':
      return [valueRow(output, value, precision, name)]
    case 'group':
      return foundRows(output.of, value as Values, precision)
    case 'list':
      return listRows(output.of, value as readonly unknown[], precision, name)
  }
}

function valueRow(output: OutputValue, value: unknown, precision: Precision, name: string): Row {
  if (Array.isArray(value)) return { name, line: running(output, value, precision) }
  const exact = output.round === 'tape' && typeof value === 'number' ? [`${value.toFixed(3)} in`] : undefined
  return { name, line: pieceOf(output, value, precision), ...(exact ? { under: exact } : {}) }
}

/** Plain values stand in one row; each row of values or set is a row, counted. */
function listRows(of: Output, values: readonly unknown[], precision: Precision, name: string): Row[] {
  if (of.kind === 'value') return [{ name, line: running(of, values, precision) }]
  return values.flatMap((value, i) => {
    const counted = `${of.label} ${i + 1}`
    if (of.kind === 'group') return [{ name: counted, line: wordsOf(of.of, value as Values, precision) }]
    return rowsOf(of, value, precision, counted).map((row) => ({ ...row, name: counted }))
  })
}

const wordsOf = (outputs: Outputs, solved: Values, precision: Precision): Line =>
  foundRows(outputs, solved, precision).flatMap(({ name, line }, i): Line => [
    `${i > 0 ? '; ' : ''}${name.toLowerCase()} `,
    ...line,
  ])

const running = (output: OutputValue, values: readonly unknown[], precision: Precision): Line =>
  values.length === 0
    ? ['none']
    : values.flatMap((value, i): Line => [...(i > 0 ? [' · '] : []), ...pieceOf(output, value, precision)])

function pieceOf(output: OutputValue, value: unknown, precision: Precision): Line {
  if (typeof value !== 'number') return [{ strong: valueText(output, value, precision) }]
  if (output.round === 'tape') return [{ tape: value }]
  if (output.round === 'dial') return [{ dial: value }]
  return [{ strong: valueText(output, value, precision) }]
}
