import { isRefusal } from '@/lib/trade/refusal'
import type { AnyCalculator, Caution, Note, Source, Step, Values } from './define'
import type { Precision } from './fields'
import { readInputs, type Fault } from './read'
import { textOf, type Text } from './text'
import { workingOf } from './working'

/** A whole answer, as the API returns it and as a cut sheet keeps it. */
export interface Answer {
  id: string
  revision: number
  /** As understood, in the contract's units. */
  inputs: Values
  outputs: Values
  text: { [name: string]: Text }
  steps: Step[]
  warnings: Note[]
  sources: readonly Source[]
}

export type Answered = { ok: true; answer: Answer } | { ok: false; errors: Fault[] }

/** Reads, solves and words one calculation. The browser and the server both come through here. */
export function answer(calculator: AnyCalculator, raw: unknown, asked: Precision): Answered {
  const reading = readInputs(calculator.inputs, raw, asked)
  if (!reading.ok) return { ok: false, errors: reading.faults }
  const { inputs } = reading
  const precision = calculator.precisionOf?.(inputs, asked) ?? asked
  const outputs = calculator.solve(inputs, precision)
  if (isRefusal(outputs)) return { ok: false, errors: [{ field: outputs.field, message: outputs.message }] }
  return {
    ok: true,
    answer: {
      id: calculator.id,
      revision: calculator.revision,
      inputs,
      outputs,
      text: textOf(calculator.outputs, outputs, precision),
      steps: workingOf(calculator, inputs, outputs, precision),
      warnings: [...reading.notes, ...(calculator.warn?.(inputs, outputs) ?? [])],
      sources: calculator.sources,
    },
  }
}

/** The cautions that stand for these numbers. */
export function standing(calculator: AnyCalculator, given: Values, solved: Values): readonly Caution<Values, Values>[] {
  return calculator.cautions.filter(({ when }) => when === undefined || when(given, solved))
}
