import type { Ink, LabelSize } from './kinds'

/** Line widths in px at full size; a hand in a glove at arm's length sees 2.4. */
export const inkWidths: Readonly<Record<Ink, number>> = {
  object: 2.4,
  cut: 2.4,
  off: 2.4,
  ghost: 2,
  post: 5,
  dim: 1.4,
  centre: 1.2,
  ext: 1,
  hatch: 1,
  flag: 1,
  tape: 1.6,
}

/** Dash and gap in px, where a line is broken. */
export const inkDashes: Readonly<Partial<Record<Ink, readonly number[]>>> = {
  cut: [10, 6],
  centre: [11, 4, 2, 4],
}

/** Size of numbers in px; words beside them are a little smaller. */
export const textSizes: Readonly<Record<LabelSize, number>> = { answer: 25, number: 21, note: 16.5 }
export const wordShare = 0.88
export const fractionShare = 0.64
