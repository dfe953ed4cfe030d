import type { Unit } from './fields'

/** How a value is read: to the tape, to the dial, to a number of decimals, or as it is. */
export type Rounding = 'tape' | 'dial' | 'exact' | { decimals: number }

export interface OutputValue {
  kind: 'value'
  label: string
  unit: Unit | 'text' | 'flag'
  round: Rounding
  /** The sentence under the number. */
  hint?: string
  symbol?: string
}
export interface OutputList {
  kind: 'list'
  label: string
  of: Output
}
export interface OutputGroup {
  kind: 'group'
  label: string
  of: { readonly [name: string]: Output }
}
/** Facts for the drawing only: in the answer over the wire, never shown as text. */
export interface OutputShape {
  kind: 'shape'
  label: string
}
export type Output = OutputValue | OutputList | OutputGroup | OutputShape
export interface Outputs {
  readonly [name: string]: Output
}

type Extra = Pick<OutputValue, 'hint' | 'symbol'>

/** A length, shown to the tape. */
export const onTape = (label: string, extra?: Extra): OutputValue => ({
  kind: 'value',
  label,
  unit: 'in',
  round: 'tape',
  ...extra,
})
/** An angle, shown to the dial. */
export const onDial = (label: string, extra?: Extra): OutputValue => ({
  kind: 'value',
  label,
  unit: 'deg',
  round: 'dial',
  ...extra,
})
/** A number shown to so many decimals in its unit. */
export const toDecimals = (label: string, unit: Unit, decimals: number, extra?: Extra): OutputValue => ({
  kind: 'value',
  label,
  unit,
  round: { decimals },
  ...extra,
})
export const words = (label: string, extra?: Extra): OutputValue => ({
  kind: 'value',
  label,
  unit: 'text',
  round: 'exact',
  ...extra,
})
export const flag = (label: string, extra?: Extra): OutputValue => ({
  kind: 'value',
  label,
  unit: 'flag',
  round: 'exact',
  ...extra,
})
export const listOf = (label: string, of: Output): OutputList => ({ kind: 'list', label, of })
export const groupOf = (label: string, of: Outputs): OutputGroup => ({ kind: 'group', label, of })
export const shapeOf = (label: string): OutputShape => ({ kind: 'shape', label })
