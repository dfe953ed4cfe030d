import { halvesBound } from './bound'
import { completions, type Budget } from './completions'
import { hair } from '../tolerance'
import type { Bar, Sizes } from './sizes'

interface Search extends Sizes {
  budget: Budget
  /** Counts that were tried with so many sticks and cannot be packed. */
  hopeless: Set<string>
}

/** The bound at a node reads every size for every threshold; so many steps of filling take as long. */
const boundCost = (sizes: number) => (sizes * sizes) / 1000

/**
 * Packs what is left into `sticks` more bars, longest piece first; `null` when it cannot, or the search was cut short.
 * The second-best way to fill a bar costs one detour, the third two.
 */
function packRest(search: Search, sticks: number, load: number, detours: number): Bar[] | null {
  if (load < hair) return []
  const { counts, capacity, budget, hopeless } = search
  const allowed = sticks * capacity - load
  const key = `${sticks}:${counts.join()}`
  budget.steps -= boundCost(counts.length)
  if (allowed < -hair || hopeless.has(key) || halvesBound(search) > sticks) return null
  for (const [cost, { bar, waste }] of completions(search, Math.max(0, allowed), budget).entries()) {
    if (budget.steps <= 0 || cost > detours) {
      budget.ranOut = true
      return null
    }
    for (const index of bar) counts[index] = (counts[index] ?? 0) - 1
    const others = packRest(search, sticks - 1, load - (capacity - waste), detours - cost)
    for (const index of bar) counts[index] = (counts[index] ?? 0) + 1
    if (others) return [bar, ...others]
  }
  if (!budget.ranOut) hopeless.add(key)
  return null
}

export interface SearchLimits extends Pick<Budget, 'steps' | 'perBar'> {
  detours: number
}

/**
 * Looks for a packing into exactly so many bars by filling one bar after the other around its longest piece.
 * `finished` false means that a limit ended it first: nothing is ruled out.
 */
export function packInto(packing: Sizes, sticks: number, { steps, perBar, detours }: SearchLimits) {
  const budget: Budget = { steps, perBar, ranOut: false }
  const load = packing.sizes.reduce((sum, size, i) => sum + size * (packing.counts[i] ?? 0), 0)
  const search = { ...packing, counts: [...packing.counts], budget, hopeless: new Set<string>() }
  const bars = packRest(search, sticks, load, detours)
  return { bars, finished: bars !== null || !budget.ranOut, spent: steps - budget.steps }
}
