import type { AnyCalculator } from '@/lib/calculators/define'
import { answer } from '@/lib/calculators/answer'
import { defaultPrecision } from '@/lib/calculators/fields'
import { typesetter } from './typeset'
import type { Typeset } from './working'

/** The entry's formulas, set by the server: those that the example's working shows. */
export function typesetAhead(calculator: AnyCalculator): Typeset {
  const answered = answer(calculator, calculator.example, defaultPrecision)
  if (!answered.ok) return {}
  const set = typesetter(calculator)
  return Object.fromEntries(answered.answer.steps.flatMap(({ formula }) => (formula ? [[formula, set(formula)]] : [])))
}
