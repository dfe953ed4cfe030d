import { hair } from '../tolerance'
import type { Sizes } from './sizes'

/** Rounds up what cannot be helped, without counting the noise of binary fractions as a stick. */
const sticksFor = (share: number) => Math.ceil(share - 1e-7)

/**
 * Fewest sticks by halves: a piece over half a stick needs its own, and what they leave is only open to pieces
 * that fit beside them. The bound known as L2 (Martello and Toth 1990), for one threshold.
 */
function boundAt({ sizes, counts, capacity }: Sizes, threshold: number): number {
  let alone = 0
  let room = 0
  let middle = 0
  for (let i = 0; i < sizes.length; i++) {
    const size = sizes[i] ?? 0
    const count = counts[i] ?? 0
    if (size < threshold - hair) break
    if (size > capacity - threshold + hair) alone += count
    else if (size > capacity / 2 + hair) {
      alone += count
      room += count * (capacity - size)
    } else middle += count * size
  }
  return alone + Math.max(0, sticksFor((middle - room) / capacity))
}

/** L2 over every threshold that matters; cheap enough to ask at each node of a search. */
export function halvesBound(packing: Sizes): number {
  const { sizes, counts, capacity } = packing
  const thresholds = sizes.filter((size, i) => size <= capacity / 2 + hair && (counts[i] ?? 0) > 0)
  return thresholds.reduce((bound, size) => Math.max(bound, boundAt(packing, size)), boundAt(packing, 0))
}

/** A share of a stick, sharpened: dual feasible, so shares that fit together still add up to one at most. */
function sharpen(share: number, parts: number): number {
  const scaled = share * (parts + 1)
  return Math.abs(scaled - Math.round(scaled)) < hair ? share : Math.floor(scaled) / parts
}

/** Near-whole pieces count whole and crumbs not at all. */
function clip(share: number, crumb: number): number {
  if (share > 1 - crumb + hair) return 1
  return share < crumb - hair ? 0 : share
}

/** Bounds by dual feasible functions (Fekete and Schepers 2001), over every threshold and ten roundings. */
function sharpenedBound({ sizes, counts, capacity }: Sizes): number {
  const shares = sizes.map((size) => Math.min(1, size / capacity))
  const crumbs = [0, ...shares.filter((share) => share <= 0.5)]
  let bound = 0
  for (const crumb of crumbs) {
    for (let parts = 1; parts <= 10; parts++) {
      const sum = shares.reduce((total, share, i) => total + (counts[i] ?? 0) * sharpen(clip(share, crumb), parts), 0)
      bound = Math.max(bound, sticksFor(sum))
    }
  }
  return bound
}

/** No packing needs fewer sticks than this. */
export const lowerBound = (packing: Sizes): number => Math.max(halvesBound(packing), sharpenedBound(packing))
