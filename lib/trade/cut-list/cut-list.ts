import { notNegative, positive } from '../checks'
import { firstRefusal, refuse, type Refusal } from '../refusal'
import { fewest } from './fewest'
import { fits, groupSizes, type Bar, type Sizes } from './sizes'

export interface CutListGiven {
  /** Overall lengths, tip to tip along the stock. */
  pieces: number[]
  stock: number
  kerf: number
  trim?: number | null
}

export interface CutListAnswer {
  sticks: number
  /** Lengths in each bar, largest first. */
  bars: number[][]
  /** Left of each bar after its pieces and one kerf a piece, never below 0. */
  drops: number[]
  /** Pieces of stock bought. */
  yieldPct: number
  /** No packing needs fewer sticks than this. */
  bound: number
  /** Whether fewer sticks were ruled out. */
  proved: boolean
  /** The same bars as places in `pieces`, counted from 0. */
  at: number[][]
}

function inputFault({ pieces, stock, kerf }: CutListGiven, trim: number): Refusal | null {
  const usable = stock - trim
  return firstRefusal([
    positive('stock', stock, 'The length of the stock'),
    notNegative('kerf', kerf, 'The kerf'),
    notNegative('trim', trim, 'The trim'),
    trim < stock ? null : refuse('trim', 'The trim leaves nothing of the stick.'),
    pieces.length > 0 ? null : refuse('pieces', 'Give at least one piece.'),
    ...pieces.map((piece, i) => positive(`pieces[${i}]`, piece, 'A piece')),
    ...pieces.map((piece, i) =>
      fits(piece, usable)
        ? null
        : refuse(`pieces[${i}]`, `A piece of ${piece} in does not fit a stick with ${usable} in to use.`),
    ),
  ])
}

/** Gives every place in a bar a piece of its size, and sorts the bars by their longest pieces. */
function placePieces(bars: readonly Bar[], { sizes }: Sizes, pieces: readonly number[], kerf: number): number[][] {
  const waiting = sizes.map((size) => pieces.flatMap((piece, at) => (piece + kerf === size ? [at] : [])))
  const inOrder = [...bars].map((bar) => [...bar].sort((a, b) => a - b)).sort(compareBars)
  return inOrder.map((bar) => bar.map((index) => waiting[index]?.shift() ?? -1))
}

/** Longer pieces first: a lower index is a longer piece. */
function compareBars(a: Bar, b: Bar): number {
  for (const [i, index] of a.entries()) {
    const other = b[i] ?? Infinity
    if (index !== other) return index - other
  }
  return a.length - b.length
}

/**
 * Fewest sticks for pieces of these lengths, a kerf between neighbours. Inches.
 * Proved up to 20 pieces; beyond, the best found, with the bound that was reached.
 * Refuses a piece longer than the usable stick by its place.
 */
export function cutList(given: CutListGiven): CutListAnswer | Refusal {
  const { pieces, stock, kerf } = given
  const trim = given.trim ?? 0
  const fault = inputFault(given, trim)
  if (fault) return fault
  const usable = stock - trim
  const packing = groupSizes(pieces, usable, kerf)
  const packed = fewest(packing)
  const at = placePieces(packed.bars, packing, pieces, kerf)
  const bars = at.map((bar) => bar.map((place) => pieces[place] ?? 0))
  const used = (bar: number[]) => bar.reduce((sum, piece) => sum + piece + kerf, 0)
  return {
    sticks: bars.length,
    bars,
    drops: bars.map((bar) => Math.max(0, usable - used(bar))),
    yieldPct: (100 * pieces.reduce((sum, piece) => sum + piece, 0)) / (bars.length * stock),
    bound: packed.bound,
    proved: packed.bound === bars.length,
    at,
  }
}
