import { showDial } from '@/lib/trade/quantity/dial'
import { showTape } from '@/lib/trade/quantity/tape'
import type { Values } from './define'
import type { Precision } from './fields'
import type { Output, OutputValue, Outputs } from './outputs'

export type Text = string | null | Text[] | { [name: string]: Text }

/** What stands behind a number of each unit. */
export const unitSuffix: Readonly<Partial<Record<OutputValue['unit'], string>>> = {
  deg: '°',
  in: ' in',
  'in/12': ' in in 12',
  'in/ft': ' in per ft',
  mm: ' mm',
  in2: ' sq in',
  lb: ' lb',
  'lb/h': ' lb an hour',
  min: ' min',
  '%': ' %',
}

/** The outputs as a tape or a dial would show them, in the same tree as the numbers. */
export function textOf(outputs: Outputs, solved: Values, precision: Precision): { [name: string]: Text } {
  return Object.fromEntries(
    Object.entries(outputs)
      .filter(([name, output]) => output.kind !== 'shape' && solved[name] !== undefined)
      .map(([name, output]) => [name, textOfOne(output, solved[name], precision)]),
  )
}

function textOfOne(output: Output, value: unknown, precision: Precision): Text {
  if (value === null || value === undefined) return null
  switch (output.kind) {
    case 'value':
      return Array.isArray(value)
        ? value.map((item: unknown) => textOfOne(output, item, precision))
        : valueText(output, value, precision)
    case 'list':
      return Array.isArray(value) ? value.map((item: unknown) => textOfOne(output.of, item, precision)) : null
    case 'group':
      return textOf(output.of, value as Values, precision)
    case 'shape':
      return null
  }
}

/** One value as it is read: 6'-2 1/2", 16 1/4°, 0.006 in, yes. */
export function valueText(output: OutputValue, value: unknown, precision: Precision): string {
  if (typeof value === 'boolean') return value ? 'yes' : 'no'
  if (typeof value !== 'number') return String(value)
  if (output.unit === 'text') return String(Number(value.toFixed(4)))
  if (output.round === 'tape') return showTape(value, precision.tape)
  if (output.round === 'dial') return showDial(value, precision.dial)
  const digits = output.round === 'exact' ? String(value) : value.toFixed(output.round.decimals)
  return `${digits.replace(/^-(0(?:\.0*)?)$/, '$1')}${unitSuffix[output.unit] ?? ''}`
}
