import { hair } from '../tolerance'
import { fits, type Bar, type Sizes } from './sizes'

export interface Completion {
  bar: Bar
  waste: number
}

/** Counts the work of a search, so that the same pieces always get the same answer, on any machine. */
export interface Budget {
  steps: number
  /** Most steps spent on the ways to fill one bar. */
  perBar: number
  /** Set when some way was left untried. */
  ranOut: boolean
}

/** Choices double with every piece: of a bar of many crumbs only so many are weighed, which rules out a little less. */
const mostWeighed = 10

/** Sums of every choice of pieces beside the first one, and how many pieces make each. */
function choices(bar: Bar, sizes: readonly number[]): { sum: number; pieces: number }[] {
  const made = [{ sum: 0, pieces: 0 }]
  for (let place = Math.max(1, bar.length - mostWeighed); place < bar.length; place++) {
    const size = sizes[bar[place] ?? 0] ?? 0
    // Only those that stood before this piece: the list grows while it is read.
    for (let i = made.length - 1; i >= 0; i--) {
      const { sum = 0, pieces = 0 } = made[i] ?? {}
      made.push({ sum: sum + size, pieces: pieces + 1 })
    }
  }
  return made
}

/** Whether some piece left over is longer than `above` and no longer than `most`. */
function anyBetween(left: readonly number[], sizes: readonly number[], above: number, most: number): boolean {
  for (let index = 0; index < sizes.length; index++) {
    const size = sizes[index] ?? 0
    if (size <= above) return false
    if (size <= most && (left[index] ?? 0) > 0) return true
  }
  return false
}

/**
 * Whether one piece left over could take the place of some in the bar and fill it no worse: then some best packing
 * does without this bar (dominance of Martello and Toth).
 */
function dominated(bar: Bar, waste: number, left: readonly number[], sizes: readonly number[]): boolean {
  return choices(bar, sizes).some(({ sum, pieces }) =>
    anyBetween(left, sizes, pieces > 1 ? sum - hair : sum + hair, sum + waste + hair),
  )
}

/** What all pieces from each size on add up to. */
function suffixSums({ sizes, counts }: Sizes): number[] {
  const sums = sizes.map((size, i) => size * (counts[i] ?? 0))
  for (let i = sums.length - 2; i >= 0; i--) sums[i] = (sums[i] ?? 0) + (sums[i + 1] ?? 0)
  return sums
}

/** Ways to fill one bar around the longest piece left, wasting no more than `allowed`; fullest first. */
export function completions(packing: Sizes, allowed: number, budget: Budget): Completion[] {
  const { sizes, counts, capacity } = packing
  const longest = counts.findIndex((count) => count > 0)
  const left = [...counts]
  const found: Completion[] = []
  const rest = suffixSums(packing)
  const bar: Bar = []
  const stopAt = Math.max(0, budget.steps - budget.perBar)

  const take = (index: number, load: number) => {
    bar.push(index)
    left[index] = (left[index] ?? 0) - 1
    extend(index, load + (sizes[index] ?? 0))
    left[index] = (left[index] ?? 0) + 1
    bar.pop()
  }
  const extend = (from: number, load: number) => {
    budget.steps--
    for (let next = from; next < sizes.length && budget.steps > stopAt; next++) {
      if (load + (rest[next] ?? 0) < capacity - allowed - hair) break
      if ((left[next] ?? 0) > 0 && fits(load + (sizes[next] ?? 0), capacity)) take(next, load)
    }
    const waste = capacity - load
    budget.steps -= 2 ** Math.min(bar.length, mostWeighed) / 32
    if (waste <= allowed + hair && !dominated(bar, waste, left, sizes)) found.push({ bar: [...bar], waste })
  }
  take(longest, 0)
  if (budget.steps <= stopAt) budget.ranOut = true
  return found.sort((a, b) => a.waste - b.waste || a.bar.length - b.bar.length)
}
