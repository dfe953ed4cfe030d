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

/** Sums of every choice of pieces beside the first one, and how many pieces make each. */
function choices(bar: Bar, sizes: readonly number[]): { sum: number; pieces: number }[] {
  let made = [{ sum: 0, pieces: 0 }]
  for (const index of bar.slice(1)) {
    const size = sizes[index] ?? 0
    made = [...made, ...made.map(({ sum, pieces }) => ({ sum: sum + size, pieces: pieces + 1 }))]
  }
  return made
}

/**
 * Whether one piece left over could take the place of some in the bar and fill it no worse: then some best packing
 * does without this bar (dominance of Martello and Toth).
 */
function dominated(bar: Bar, waste: number, left: readonly number[], sizes: readonly number[]): boolean {
  return choices(bar, sizes).some(({ sum, pieces }) =>
    left.some((count, index) => {
      const size = sizes[index] ?? 0
      if (count <= 0 || size > sum + waste + hair) return false
      return pieces > 1 ? size >= sum - hair : size > sum + hair
    }),
  )
}

/** Ways to fill one bar around the longest piece left, wasting no more than `allowed`; fullest first. */
export function completions({ sizes, counts, capacity }: Sizes, allowed: number, budget: Budget): Completion[] {
  const longest = counts.findIndex((count) => count > 0)
  const left = [...counts]
  const found: Completion[] = []
  // What all pieces from an index on could still add.
  const rest = sizes.map((_, from) =>
    sizes.reduce((sum, size, i) => (i >= from ? sum + size * (counts[i] ?? 0) : sum), 0),
  )
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
    if (waste <= allowed + hair && !dominated(bar, waste, left, sizes)) found.push({ bar: [...bar], waste })
  }
  take(longest, 0)
  if (budget.steps <= stopAt) budget.ranOut = true
  return found.sort((a, b) => a.waste - b.waste || a.bar.length - b.bar.length)
}
