'use client'

import type { Answer } from '@/lib/calculators/answer'
import type { AnyCalculator, Caution, Values } from '@/lib/calculators/define'
import type { Precision } from '@/lib/calculators/fields'
import { valueText } from '@/lib/calculators/text'
import type { Preferences } from '@/lib/schemas/account'
import { CautionWord } from '../ui/caution-word'
import { Reading } from './reading'
import { glanceOf, type ShownOutput } from './shown-outputs'

interface ResultsProps {
  calculator: AnyCalculator
  answer: Answer
  stale: boolean
  precision: Precision
  preferences: Preferences
  cautions: readonly Caution<Values, Values>[]
}

/** The numbers people come for, a card each; the first is the one answer. */
export function Results({ calculator, answer, stale, precision, preferences, cautions }: ResultsProps) {
  const shown = glanceOf(calculator, answer.outputs, preferences.sawSquare)
  return (
    <div className="results" data-stale={stale || undefined} aria-live="polite" aria-atomic="false">
      {stale && <p className="results-stale">These are still the last numbers that could be read.</p>}
      {shown.map(({ name, output, value }) => (
        <div key={name} className="result">
          <span className="result-label">{output.label}</span>
          <b className={typeof value === 'number' ? 'result-value' : 'result-value result-words'}>
            <Reading output={output} value={value} precision={precision} units={preferences.units} />
          </b>
          <small>{noteOf(calculator, answer, { name, output, value }, precision)}</small>
          {cautions
            .filter(({ beside }) => beside === name)
            .map(({ signal, text }) => (
              <small key={text} className="result-caution">
                <CautionWord signal={signal} /> {text}
              </small>
            ))}
        </div>
      ))}
    </div>
  )
}

/** The exact decimal, and the entry's own sentence under the number. */
function noteOf(
  calculator: AnyCalculator,
  { outputs }: Answer,
  { name, output, value }: ShownOutput,
  precision: Precision,
): string {
  const exactName = name === calculator.answer && typeof value === 'number' ? calculator.exactAnswer : undefined
  const twin = exactName === undefined ? undefined : calculator.outputs[exactName]
  if (exactName !== undefined && twin?.kind === 'value') {
    return join(`exactly ${valueText(twin, outputs[exactName], precision)}`, output.hint)
  }
  const rounded = output.round === 'tape' && typeof value === 'number' && !isOnTape(value, precision.tape)
  return join(rounded ? `exactly ${Number(value.toFixed(4))} in` : undefined, output.hint)
}

const isOnTape = (inches: number, den: number) => Math.abs(inches * den - Math.round(inches * den)) < 1e-6
const join = (...parts: (string | undefined)[]) => parts.filter(Boolean).join('; ')
