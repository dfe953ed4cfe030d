import { refuse, type Refusal } from './refusal'

/** Refuses what is not a number above zero. `name` opens the sentence: "The depth". */
export function positive(field: string, value: number | null | undefined, name: string): Refusal | null {
  return typeof value === 'number' && value > 0 && Number.isFinite(value)
    ? null
    : refuse(field, `${name} must be more than 0.`)
}

/** Refuses what is not zero or more. */
export function notNegative(field: string, value: number | null | undefined, name: string): Refusal | null {
  return typeof value === 'number' && value >= 0 && Number.isFinite(value)
    ? null
    : refuse(field, `${name} must be 0 or more.`)
}

/** Refuses what does not lie in the open range between `least` and `most`. */
export function between(field: string, value: number, least: number, most: number, name: string): Refusal | null {
  return value > least && value < most ? null : refuse(field, `${name} must lie between ${least} and ${most}.`)
}
