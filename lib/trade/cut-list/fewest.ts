import { lowerBound } from './bound'
import { quickPacking } from './heuristics'
import { packInto, type SearchLimits } from './search'
import type { Bar, Sizes } from './sizes'

/** Up to here every search runs to its end. */
const exactUpTo = 20

/** Whole numbers only: budgets are subtracted from one another. */
const unlimited = Number.MAX_SAFE_INTEGER

/** A short look for a packing that is easily found, then all of them. */
const toTheEnd: readonly SearchLimits[] = [
  { steps: 4_000, perBar: 400, detours: 6 },
  { steps: unlimited, perBar: unlimited, detours: unlimited },
]
/** Short searches near the fullest bars come before a longer one; steps, not time, so that answers repeat. */
const inShort: readonly SearchLimits[] = [
  { steps: 40_000, perBar: 2_000, detours: 1 },
  { steps: 80_000, perBar: 2_000, detours: 3 },
  { steps: 120_000, perBar: 4_000, detours: 8 },
  { steps: 60_000, perBar: unlimited, detours: unlimited },
]
/** Steps for all the searches of a long list together. */
const purse = 400_000

export interface Packed {
  bars: Bar[]
  /** No packing needs fewer bars than this. */
  bound: number
}

/** From the lower bound up: the first count that can be packed is the fewest. */
function fewestProved(packing: Sizes, quick: Bar[], bound: number): Packed {
  for (let sticks = bound; sticks < quick.length; sticks++) {
    for (const limits of toTheEnd) {
      const { bars } = packInto(packing, sticks, limits)
      if (bars) return { bars, bound: sticks }
    }
  }
  return { bars: quick, bound: quick.length }
}

/** From the best packing down, a stick at a time, until none is found or the purse is empty. */
function fewestFound(packing: Sizes, quick: Bar[], bound: number): Packed {
  let best = quick
  let left = purse
  for (let pass = 0; best.length > bound && pass < inShort.length && left > 0;) {
    const limits = inShort[pass] ?? { steps: 0, perBar: 0, detours: 0 }
    const { bars, finished, spent } = packInto(packing, best.length - 1, {
      ...limits,
      steps: Math.min(limits.steps, left),
    })
    left -= spent
    if (bars) best = bars
    else if (finished) return { bars: best, bound: best.length }
    else pass++
  }
  return { bars: best, bound }
}

/** Fewest bars, proved up to 20 pieces; beyond, the fewest found, with the bound that was reached. */
export function fewest(packing: Sizes): Packed {
  const quick = quickPacking(packing)
  const bound = lowerBound(packing)
  if (bound >= quick.length) return { bars: quick, bound: quick.length }
  const pieces = packing.counts.reduce((sum, count) => sum + count, 0)
  return pieces <= exactUpTo ? fewestProved(packing, quick, bound) : fewestFound(packing, quick, bound)
}
