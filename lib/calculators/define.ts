import type { Refusal } from '@/lib/trade/refusal'
import type { Fields, Precision, ValuesOf } from './fields'
import type { Output } from './outputs'

export type Stage = 'safety' | 'triangle' | 'field' | 'cutting' | 'weld' | 'deliver'

/** Signal words of ANSI Z535. */
export type Signal = 'danger' | 'warning' | 'caution' | 'notice'

export interface Caution<I, O> {
  signal: Signal
  text: string
  /** The input or output it stands beside; left out, it stands with the answer. */
  beside?: (keyof I & string) | (keyof O & string)
  /** Left out, it always stands. */
  when?: (given: I, solved: O) => boolean
}

export interface Source {
  says: string
  /** Publication and section, or "common practice, no published source", or "from memory". */
  where: string
}

/** One line of the working. `formula` and `substituted` are math syntax; a search or a table has a sentence only. */
export interface Step {
  says: string
  formula?: string
  substituted?: string
  value: string
}

export interface ShownFormula {
  says: string
  formula: string
}
/** Formulas in math syntax, in order: an entry may use the inputs and the names above it. Trig functions are in degrees. */
export type Shown = Readonly<Record<string, ShownFormula>>

export interface Note {
  field?: string
  message: string
}

export interface CalculatorEntry<I, O extends object> {
  id: string
  /** Raised when a stored answer would change. */
  revision: number
  stage: Stage
  name: string
  /** The question it answers, as asked in the shop. */
  asks: string
  lede: string
  /** What else people call it, for search. */
  alsoCalled: readonly string[]
  /** Filled in at the first visit, as a person would type it. */
  example: Readonly<Record<string, unknown>>
  outputs: { readonly [K in keyof O]-?: Output }
  /** The number people come for, and its unrounded twin that sensitivity is measured on. */
  answer: keyof O & string
  exactAnswer?: keyof O & string
  /** Outputs that stand as cards under the drawing, in order. */
  glance: readonly (keyof O & string)[]
  /** Pure: numbers in, numbers out, or a refusal naming the field. */
  solve: (given: I, precision: Precision) => O | Refusal
  /** An entry with a den, dialStep or step of its own reads by it rather than by the reader's precision. */
  precisionOf?: (given: I, asked: Precision) => Precision
  /** Warnings beyond the usual ranges of the fields. */
  warn?: (given: I, solved: O) => Note[]
  shown?: Shown | ((given: I, solved: O) => Shown)
  /** For what a formula cannot say: a branch, a table, a search. */
  steps?: (given: I, solved: O, precision: Precision) => Step[]
  cautions: readonly Caution<I, O>[]
  sources: readonly Source[]
  /** Ids of calculators that people go on to. */
  related: readonly string[]
  basis: string
}

export interface Calculator<F extends Fields = Fields, O extends object = object> extends CalculatorEntry<
  ValuesOf<F>,
  O
> {
  inputs: F
}

/** An entry as the engine handles it: values by name, nothing known beyond the fields. */
export type AnyCalculator = Omit<
  Calculator,
  'solve' | 'precisionOf' | 'warn' | 'shown' | 'steps' | 'cautions' | 'answer' | 'exactAnswer' | 'glance' | 'outputs'
> & {
  outputs: Readonly<Record<string, Output>>
  answer: string
  exactAnswer?: string
  glance: readonly string[]
  solve: (given: Values, precision: Precision) => Values | Refusal
  precisionOf?: (given: Values, asked: Precision) => Precision
  warn?: (given: Values, solved: Values) => Note[]
  shown?: Shown | ((given: Values, solved: Values) => Shown)
  steps?: (given: Values, solved: Values, precision: Precision) => Step[]
  cautions: readonly Caution<Values, Values>[]
}

export type Values = Record<string, unknown>

/** Describes a calculator once; names in solve, glance, cautions and outputs are checked against its own fields. */
export function defineCalculator<const F extends Fields, O extends object>(
  entry: CalculatorEntry<ValuesOf<F>, O> & { inputs: F },
): Calculator<F, O> {
  return entry
}

/** Drops the names that only the entry's own file knows, so that one engine serves them all. */
export function asAny<F extends Fields, O extends object>(entry: Calculator<F, O>): AnyCalculator {
  return entry as unknown as AnyCalculator
}
