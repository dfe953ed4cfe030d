import { toDial } from '@/lib/trade/angles'
import { mmPerInch } from '@/lib/trade/quantity/metric'
import { atMost, hair } from '@/lib/trade/tolerance'
import { measures, orderOf, type AnyGivens, type Exercise, type Measure, type Part, type Slip } from './exercise'
import { readAnswer } from './read-answer'
import type { SlipCode } from './slips'

/** What a person answers to one part: typed text, one of the options, or places in order. */
export type Reply = string | readonly number[]

export type PartVerdict = { good: true } | { good: false; slips: SlipCode[] }

export type Judgement =
  /** Nothing was judged and nothing is held against anyone: a sentence for each part that could not be read. */
  { read: false; says: (string | null)[] } | { read: true; good: boolean; parts: PartVerdict[] }

/** The marks people round to: steps of a saw dial in degrees, of a tape in inches or whole millimetres. */
const marks = { deg: [1 / 4, 1 / 2, 1], in: [1 / 64, 1 / 32, 1 / 16, 1 / 8, 1 / mmPerInch] }

/** A number and what it may be rounded to before somebody writes it down. */
const asWritten = (value: number, measure: Measure): number[] => [
  value,
  ...marks[measures[measure].unit].map((step) => toDial(value, step)),
]

/**
 * Judges the replies to one draw, part by part, and names the slips that give the same wrong answer. While one reply
 * cannot be read none is judged. Called on the server alone, as answers are read there.
 */
export function judge<G extends AnyGivens>(exercise: Exercise<G>, givens: G, replies: readonly Reply[]): Judgement {
  const judged = exercise.parts.map((part, at) => judgePart(part, givens, replies[at]))
  const parts = judged.filter((verdict) => typeof verdict !== 'string')
  if (parts.length < judged.length)
    return { read: false, says: judged.map((verdict) => (typeof verdict === 'string' ? verdict : null)) }
  return { read: true, good: parts.every(({ good }) => good), parts }
}

function judgePart<G>(part: Part<G>, givens: G, reply: Reply | undefined): PartVerdict | string {
  switch (part.kind) {
    case 'number': {
      const read = readAnswer(typeof reply === 'string' ? reply : '', measures[part.measure].unit)
      if ('misread' in read) return read.misread
      if (isWithin(read.value, part.solve(givens), part.measure)) return { good: true }
      return wrong(part.slips, givens, (value) => wouldGive(value, read.value, part.measure))
    }
    case 'choice':
      if (typeof reply !== 'string' || !part.options.includes(reply)) return `choose one: ${part.options.join(' or ')}.`
      return reply === part.solve(givens) ? { good: true } : wrong(part.slips, givens, (value) => value === reply)
    case 'order': {
      const right = orderOf(part.solve(givens))
      if (!isOrder(reply, right.length)) return 'give each of them one place.'
      const same = (order: readonly number[]) => order.every((place, at) => place === reply[at])
      return same(right) ? { good: true } : wrong(part.slips, givens, (readings) => same(orderOf(readings)))
    }
  }
}

/** A wrong answer, with every slip that leads to it: one that fits two is named as both. */
function wrong<G, Value>(slips: readonly Slip<G, Value>[], givens: G, leadsTo: (value: Value) => boolean): PartVerdict {
  const fits = slips.filter((slip) => {
    const value = slip.wrong(givens)
    return value !== null && leadsTo(value)
  })
  return { good: false, slips: fits.map(({ code }) => code) }
}

/** Within shop tolerance; a number on the limit is. */
const isWithin = (value: number, right: number, measure: Measure) =>
  atMost(Math.abs(value - right), measures[measure].tolerance)

/** Whether a slip that gives `value` would be written as `typed`: cut off after a decimal or so, or rounded to a mark. */
function wouldGive(value: number, typed: number, measure: Measure): boolean {
  if (Math.abs(value - typed) <= measures[measure].tolerance / 4 + hair) return true
  return asWritten(value, measure).some((written) => Math.abs(written - typed) <= hair)
}

const isOrder = (reply: Reply | undefined, count: number): reply is readonly number[] =>
  Array.isArray(reply) && reply.length === count && new Set(reply).size === count && reply.every((at) => at in reply)
