import { partsOf, showParts, type Parts } from './fraction'

/** Splits degrees at the nearest mark of a dial with this step (0.25, 0.5 or 1). */
export const dialParts = (degrees: number, step: number): Parts => partsOf(degrees, Math.round(1 / step))

/** Degrees as text to the dial's step: `16 1/4°`, `-3 1/2°`. */
export function showDial(degrees: number, step: number): string {
  const parts = dialParts(degrees, step)
  return `${parts.negative ? '-' : ''}${showParts(parts)}°`
}
