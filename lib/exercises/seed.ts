/** Draws from a seed, in the steps a shop would write. The same seed gives the same draws on every machine. */
export interface Draws {
  /** One of the list. */
  pick: <T>(list: readonly [T, ...T[]]) => T
  /** A number from `least` to `most`, both reached, in steps of `by`. */
  step: (least: number, most: number, by: number) => number
  /** The list in another order. */
  shuffle: <T>(list: readonly T[]) => T[]
}

/**
 * Mulberry32 (Tommy Ettinger, 2017, given to the public domain): 32 bits of state that go up by an odd constant, mixed
 * twice. Good enough to deal givens; nothing secret hangs on it.
 * @returns numbers from 0 to under 1
 */
export function mulberry32(seed: number): () => number {
  let state = seed | 0
  return () => {
    state = (state + 0x6d2b79f5) | 0
    let mixed = Math.imul(state ^ (state >>> 15), state | 1)
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61)
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32
  }
}

/** Draws from a whole number of 32 bits. */
export function drawsFrom(seed: number): Draws {
  const next = mulberry32(seed)
  const below = (count: number) => Math.floor(next() * count)
  return {
    pick: (list) => list[below(list.length)] ?? list[0],
    // Counted in steps, so that no sum of fractions drifts off the tape.
    step: (least, most, by) => least + below(Math.round((most - least) / by) + 1) * by,
    shuffle: (list) => {
      const rest = [...list]
      return list.flatMap(() => rest.splice(below(rest.length), 1))
    },
  }
}
