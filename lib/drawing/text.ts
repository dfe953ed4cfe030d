import { dialParts } from '@/lib/trade/quantity/dial'
import { tapeParts } from '@/lib/trade/quantity/tape'
import { showMetric } from '@/lib/trade/quantity/metric'
import type { LabelInk, Shape, Show } from './kinds'

/** A piece of a label. Numbers are set in the mono face, words in the heading face, fractions as fractions. */
export type Run = { ink?: LabelInk } & (
  | { kind: 'number'; text: string }
  | { kind: 'word'; text: string }
  | { kind: 'fraction'; over: number; under: number }
  | { kind: 'shape'; shape: Shape }
)
export type Line = readonly Run[]
export type RichText = readonly Line[]

export const number = (text: string, ink?: LabelInk): Run => ({ kind: 'number', text, ink })
export const word = (text: string, ink: LabelInk = 'quiet'): Run => ({ kind: 'word', text, ink })
export const shape = (which: Shape, ink?: LabelInk): Run => ({ kind: 'shape', shape: which, ink })

/** A length as the tape reads it: feet, inches and a true fraction, with primes. Inches in. */
export function length(inches: number, show: Show, ink?: LabelInk): Line {
  if (show.metric) return [number(showMetric(inches), ink)]
  return tapeLine(tapeParts(inches, show.tape), ink)
}

/** A height or a depth, which the trade says in inches alone: 36″, not 3′. Inches in. */
export function inchesOnly(inches: number, show: Show, ink?: LabelInk): Line {
  if (show.metric) return [number(showMetric(inches), ink)]
  const parts = tapeParts(inches, show.tape)
  return tapeLine({ ...parts, feet: 0, inches: parts.feet * 12 + parts.inches }, ink)
}

function tapeLine(
  { negative, feet, inches: whole, numerator, denominator }: ReturnType<typeof tapeParts>,
  ink?: LabelInk,
): Line {
  const sign = negative ? '−' : ''
  const hasFraction = numerator > 0
  const runs: Run[] = feet > 0 ? [number(`${sign}${feet}`, ink), word('′', ink ?? 'text')] : []
  const lead = feet > 0 ? '-' : sign
  if (whole > 0 || feet > 0 || !hasFraction) runs.push(number(`${lead}${whole}`, ink))
  else if (sign) runs.push(number(sign, ink))
  if (hasFraction) runs.push({ kind: 'fraction', over: numerator, under: denominator, ink })
  return [...runs, word('″', ink ?? 'text')]
}

/** An angle as the dial reads it, to its step. Degrees in. */
export function dial(degrees: number, show: Show, ink?: LabelInk): Line {
  const { negative, whole, numerator, denominator } = dialParts(degrees, show.dial)
  const sign = negative ? '−' : ''
  const head = number(`${sign}${whole}`, ink)
  if (numerator === 0) return [number(`${sign}${whole}°`, ink)]
  return [head, { kind: 'fraction', over: numerator, under: denominator, ink }, number('°', ink)]
}

/** An angle to a number of decimals, trailing zeros left off. Degrees in. */
export function degrees(value: number, decimals: number, ink?: LabelInk): Line {
  const shown = Number(value.toFixed(decimals))
  return [number(`${shown < 0 ? '−' : ''}${Math.abs(shown)}°`, ink)]
}

/** What a label says, in plain characters: for a text alternative. */
export function plain(text: RichText): string {
  const said = (run: Run) => {
    if (run.kind === 'fraction') return `${run.over}/${run.under}`
    return run.kind === 'shape' ? '' : run.text
  }
  // A fraction after a whole number needs its space: 2 1/2, not 21/2.
  const joined = (line: Line) =>
    line.reduce((so, run) => so + (run.kind === 'fraction' && /\d$/.test(so) ? ' ' : '') + said(run), '').trim()
  return text.map(joined).join(', ')
}
