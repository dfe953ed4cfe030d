import type { Answer } from '@/lib/calculators/answer'
import type { AnyCalculator } from '@/lib/calculators/define'
import { valueText, type Text } from '@/lib/calculators/text'
import type { Precision } from '@/lib/calculators/fields'
import type { RawInputs } from './address'
import { textOfRaw } from './field-kinds'
import { unitWords } from './unit-words'

/** A whole answer as plain text: what was given as it was typed, what came out, what to mind, where to find it again. */
export function answerText(
  calculator: AnyCalculator,
  raw: RawInputs,
  answer: Answer,
  address: string,
  precision: Precision,
): string {
  const given = Object.entries(calculator.inputs).flatMap(([name, field]) => {
    const value = Array.isArray(raw[name]) ? raw[name].map(textOfRaw).join('; ') : textOfRaw(raw[name])
    const unit = 'unit' in field ? (unitWords[field.unit] ?? '') : ''
    return value === '' ? [] : [`${field.label}: ${/[a-z'"°′″]/i.test(value) ? value : `${value} ${unit}`.trim()}`]
  })
  const found = Object.entries(calculator.outputs).flatMap(([name, output]) => {
    const value = answer.outputs[name]
    if (output.kind === 'value' && value !== undefined && value !== null)
      return [`${output.label}: ${valueText(output, value, precision)}`]
    return output.kind === 'list' ? [`${output.label}: ${flat(answer.text[name])}`] : []
  })
  const remarks = answer.warnings.map(({ message }) => message)
  return [
    calculator.name,
    '',
    ...given,
    '',
    ...found,
    ...(remarks.length > 0 ? ['', ...remarks] : []),
    '',
    address,
  ].join('\n')
}

function flat(text: Text | undefined): string {
  if (text === undefined || text === null) return 'none'
  if (typeof text === 'string') return text
  if (Array.isArray(text)) return text.map(flat).join('; ')
  return Object.values(text).map(flat).join(' ')
}
