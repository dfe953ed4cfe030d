import { showDial } from '../quantity/dial'
import { partsOf, showParts } from '../quantity/fraction'
import { showMetric } from '../quantity/metric'
import { showTape } from '../quantity/tape'
import type { Closing, PartEnd, RailSticks, Section } from './types'

/** How a rail is said in the shop: one wording for screen, sheet and message. */
export const faceWords: Readonly<Record<PartEnd['longPoint'], string>> = {
  top: 'long on top',
  underside: 'long underneath',
  square: 'square',
  'room side (plan)': 'long on the room side, cut in plan',
}

/** Degrees that the saw reads for an angle off square, by what the saw calls square. */
export const sawReading = (offSquare: number, sawSquare: 0 | 90): number =>
  sawSquare === 90 ? 90 - offSquare : offSquare

/** One end's cut in words: `saw 16 1/4°, long on top`. `step` is the finest mark of the dial, degrees. */
export function endText(end: PartEnd, step: number, sawSquare: 0 | 90): string {
  if (end.longPoint === 'square') return 'square'
  return `saw ${showDial(sawReading(end.saw, sawSquare), step)}, ${faceWords[end.longPoint]}`
}

const shapeWords = { round: 'round', square: 'square', rect: 'rectangular' } as const

/** The section as it is ordered: 1.66 in round, 2" × 1" rectangular; fractions where the tape has them. */
export function sectionText({ shape, depth, width }: Section, den: number): string {
  const size = (inches: number) =>
    Math.abs(inches * den - Math.round(inches * den)) < 1e-6 ? showTape(inches, den) : `${Number(inches.toFixed(3))} in`
  return depth === width
    ? `${size(depth)} ${shapeWords[shape]}`
    : `${size(depth)} × ${size(width)} ${shapeWords[shape]}`
}

/** A height, which the trade says in inches alone: 36", not 3'-0"; in millimetres where the reader asks for them. */
export function heightText(inches: number, den: number, units: 'in' | 'mm'): string {
  return units === 'mm' ? showMetric(inches) : `${showParts(partsOf(inches, den))}"`
}

/** A slope to the hundredth of a degree, with a true minus. */
export const slopeText = (slope: number): string => `${slope < 0 ? '−' : ''}${Number(Math.abs(slope).toFixed(2))}°`

/** How many sticks, and whether fewer could do. */
export function sticksText({ sticks, bound, proved }: Pick<RailSticks, 'sticks' | 'bound' | 'proved'>): string {
  const many = `${sticks} ${sticks === 1 ? 'stick' : 'sticks'}`
  return proved ? `${many}, and no fewer can do` : `${many}; ${bound} not ruled out`
}

/** Whether the three tapes of a flight close, in a sentence. */
export function closingText({ error, verdict }: Closing, den: number): string {
  const off = showTape(Math.abs(error), den)
  if (verdict === 'measure again') return `Measure again: the three tapes do not close by ${off}.`
  return off === '0"' ? 'The three tapes close.' : `The three tapes close within ${off}.`
}
