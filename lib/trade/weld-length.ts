import { cosDeg } from './angles'
import { positive } from './checks'
import { firstRefusal, refuse, type Refusal } from './refusal'

/** Perimeter of an ellipse from its two axes, by the arithmetic-geometric mean; exact to the last bits. */
export function ellipsePerimeter(long: number, short: number): number {
  let a = long / 2
  let b = short / 2
  let sum = a * a
  // The digits double at every turn: eight are plenty for any ellipse a saw can cut.
  for (let turn = 0, weight = 1; turn < 8; turn++, weight *= 2) {
    const half = (a - b) / 2
    const mean = (a + b) / 2
    b = Math.sqrt(a * b)
    a = mean
    sum -= weight * half * half
  }
  return (Math.PI * 2 * (sum - (long * long - short * short) / 8)) / a
}

/** Once around a bar cut at `miter` degrees; `along` is the side that the cut lengthens. Inches. */
export function weldAround(round: boolean, along: number, across: number, miter: number): number {
  const lengthened = along / cosDeg(miter)
  return round ? ellipsePerimeter(lengthened, across) : 2 * (lengthened + across)
}

export interface WeldLengthGiven {
  shape: 'round' | 'rect'
  outside?: number | null
  width?: number | null
  depth?: number | null
  miter: number
}

/** Inches of weld around one mitered joint: an ellipse for round stock, a rectangle for the rest. */
export function weldLength({ shape, outside, width, depth, miter }: WeldLengthGiven): { perimeter: number } | Refusal {
  const round = shape === 'round'
  const fault = firstRefusal([
    round ? positive('outside', outside, 'The outside diameter of round stock') : null,
    round ? null : positive('width', width, 'The width of rectangular stock'),
    round ? null : positive('depth', depth, 'The depth of rectangular stock'),
    miter >= 0 && miter < 90 ? null : refuse('miter', 'A miter lies between 0° and 90° off square.'),
  ])
  if (fault) return fault
  return {
    perimeter: round
      ? weldAround(true, outside ?? 0, outside ?? 0, miter)
      : weldAround(false, depth ?? 0, width ?? 0, miter),
  }
}
