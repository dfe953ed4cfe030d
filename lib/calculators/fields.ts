/** What an entry asks for: the shapes of inputs, and the values that solve receives. */

/** Units of the contract. Lengths are inches and angles degrees inside; metric is reading and display. */
export type Unit = 'in' | 'deg' | 'in/ft' | 'in/12' | 'mm' | 'in2' | 'lb' | 'lb/h' | 'min' | '%' | 'ratio' | 'none'

/** Precision of the reader's tape (denominator of an inch) and saw dial (degrees). */
export interface Precision {
  tape: 8 | 16 | 32 | 64
  dial: 0.25 | 0.5 | 1
}

export const defaultPrecision: Precision = { tape: 16, dial: 0.25 }

/** Left out, an entry's own tape or dial is the reader's. */
export const readersTape = ({ tape }: Precision) => tape
export const readersDial = ({ dial }: Precision) => dial

type Fallback = number | string | null | ((precision: Precision) => number)

interface Common {
  label: string
  hint?: string
  /** Value used when the input is left out; without it the input must be given. */
  fallback?: Fallback
  /** How the working writes it, as TeX. */
  symbol?: string
}

interface Ranged extends Common {
  /** Usual range: outside it a warning, not a refusal. */
  sane?: readonly [number, number]
  /** Hard ends of the maths: outside them a refusal. */
  least?: number
  most?: number
  /** Strictly greater than this. */
  above?: number
}

export interface QuantityField extends Ranged {
  kind: 'quantity'
  unit: Unit
}
export interface WholeField extends Ranged {
  kind: 'whole'
  unit: 'none'
}
export interface ChoiceField<T extends string | number = string | number> extends Common {
  kind: 'choice'
  options: readonly T[]
  /** What a person reads for each option, in the same order. */
  names?: readonly string[]
}
export interface ListField<F extends Field = Field> extends Common {
  kind: 'list'
  of: F
  least: number
  most: number
}
export interface GroupField<G extends Fields = Fields> extends Common {
  kind: 'group'
  fields: G
}
/** One of several sets of inputs, told apart by the first key of each. */
export interface FormsField<G extends readonly Fields[] = readonly Fields[]> extends Common {
  kind: 'forms'
  forms: G
}

export type Field = QuantityField | WholeField | ChoiceField | ListField | GroupField | FormsField
export interface Fields {
  readonly [name: string]: Field
}

type Settled<F> = F extends { fallback: null } ? null : never
type Raw<F> =
  F extends ChoiceField<infer T>
    ? T
    : F extends ListField<infer I>
      ? ValueOf<I>[]
      : F extends GroupField<infer G>
        ? ValuesOf<G>
        : F extends FormsField<infer A>
          ? ValuesOf<A[number]>
          : number
export type ValueOf<F> = Raw<F> | Settled<F>
/** What solve receives for these fields: every key present, left-out ones at their fallback. */
export type ValuesOf<G extends Fields> = G extends Fields ? { [K in keyof G]: ValueOf<G[K]> } : never

type Extra<T extends Common> = Omit<
  T,
  'kind' | 'label' | 'unit' | 'options' | 'of' | 'fields' | 'forms' | 'least' | 'most'
>
type RangedExtra = Extra<QuantityField> & Pick<Ranged, 'least' | 'most'>
/** Of what is said besides, the types need to know only whether null stands for left out. */
type Nullable<E> = E extends { fallback: null } ? { fallback: null } : unknown

export const quantity = <const E extends RangedExtra = object>(label: string, unit: Unit, extra?: E) =>
  ({ kind: 'quantity', label, unit, ...extra }) as QuantityField & Nullable<E>
export const inches = <const E extends RangedExtra = object>(label: string, extra?: E) => quantity(label, 'in', extra)
export const degrees = <const E extends RangedExtra = object>(label: string, extra?: E) => quantity(label, 'deg', extra)
export const whole = <const E extends RangedExtra = object>(label: string, extra?: E) =>
  ({ kind: 'whole', label, unit: 'none', ...extra }) as WholeField & Nullable<E>
export const choice = <const T extends string | number, const E extends Extra<ChoiceField> = object>(
  label: string,
  options: readonly T[],
  extra?: E,
) => ({ kind: 'choice', label, options, ...extra }) as ChoiceField<T> & Nullable<E>
export const list = <F extends Field, const E extends Extra<Common & { kind: 'list' }> = object>(
  label: string,
  of: F,
  size: { least: number; most: number },
  extra?: E,
) => ({ kind: 'list', label, of, ...size, ...extra }) as unknown as ListField<F> & Nullable<E>
export const group = <G extends Fields, const E extends Extra<Common & { kind: 'group' }> = object>(
  label: string,
  fields: G,
  extra?: E,
) => ({ kind: 'group', label, fields, ...extra }) as unknown as GroupField<G> & Nullable<E>
export const forms = <const G extends readonly Fields[], const E extends Extra<Common & { kind: 'forms' }> = object>(
  label: string,
  shapes: G,
  extra?: E,
) => ({ kind: 'forms', label, forms: shapes, ...extra }) as unknown as FormsField<G> & Nullable<E>
