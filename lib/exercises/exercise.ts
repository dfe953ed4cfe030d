import type { Draws } from './seed'
import type { SlipCode } from './slips'

export interface Knuckle {
  slopeBelow: number
  slopeAbove: number
}

/**
 * Everything an exercise may give, by name. The list is closed and no name in it is an answer's: what is shown before
 * judging is made of these alone, so it has no place for a solution. Inches and degrees; slopes up the stairs positive.
 */
export interface AnyGivens {
  readonly unitRise?: number
  readonly unitRun?: number
  readonly slopeBelow?: number
  readonly slopeAbove?: number
  /** What the saw reads at a square cut. */
  readonly sawAtSquare?: 0 | 90
  readonly knuckles?: readonly Knuckle[]
}

/** What a kind of measure may be off by in a shop, and its unit. */
export const measures = {
  length: { unit: 'in', tolerance: 1 / 16 },
  layout: { unit: 'in', tolerance: 1 / 8 },
  angle: { unit: 'deg', tolerance: 1 / 2 },
} as const

export type Measure = keyof typeof measures

/** A known way to go wrong: the part's own solution with one thing altered. `null` where these givens leave no room for it. */
export interface Slip<G, Value> {
  code: SlipCode
  wrong(givens: G): Value | null
}

export interface NumberPart<G> {
  kind: 'number'
  asks: string
  measure: Measure
  solve(givens: G): number
  slips: readonly Slip<G, number>[]
}

export interface ChoicePart<G> {
  kind: 'choice'
  asks: string
  options: readonly string[]
  solve(givens: G): string
  slips: readonly Slip<G, string>[]
}

/** Things to put in order, least reading first; they are named by their place in the givens, from 0. */
export interface OrderPart<G> {
  kind: 'order'
  asks: string
  measure: Measure
  /** What each thing is ordered by. */
  solve(givens: G): readonly number[]
  slips: readonly Slip<G, readonly number[]>[]
}

export type Part<G> = NumberPart<G> | ChoicePart<G> | OrderPart<G>

export interface Exercise<G extends AnyGivens = AnyGivens> {
  id: string
  /** Raise it when the same givens would be judged otherwise. */
  revision: number
  kind: 'number' | 'two-part' | 'order'
  /** The task in words, the same for every draw. */
  asks: string
  gives: readonly (keyof AnyGivens)[]
  drawGivens(draws: Draws): G
  parts: readonly Part<G>[]
}

/** Places of the readings, least first: how a person would line the things up. */
export const orderOf = (readings: readonly number[]): number[] =>
  readings.map((_, place) => place).sort((a, b) => (readings[a] ?? 0) - (readings[b] ?? 0))
