import { hair } from '../tolerance'

/**
 * Pieces grouped by size, largest first. A kerf stands BETWEEN pieces, so every piece is taken one kerf longer
 * and so is the stick: then pieces fit when their sizes add up to no more than the capacity.
 */
export interface Sizes {
  sizes: number[]
  counts: number[]
  capacity: number
}

/** One bar as indices into `sizes`, largest piece first. */
export type Bar = number[]

export const fits = (load: number, capacity: number) => load <= capacity + hair

/** Groups lengths in inches into sizes. */
export function groupSizes(pieces: readonly number[], usable: number, kerf: number): Sizes {
  const sorted = [...pieces].sort((a, b) => b - a)
  const lengths = [...new Set(sorted)]
  const counts = lengths.map((length) => sorted.filter((piece) => piece === length).length)
  return { sizes: lengths.map((length) => length + kerf), counts, capacity: usable + kerf }
}

/** Every size once for each piece of it, largest first. */
export const eachPiece = (counts: readonly number[]): number[] =>
  counts.flatMap((count, index) => Array.from({ length: count }, () => index))
