import { eachPiece, fits, type Bar, type Sizes } from './sizes'

interface Filled {
  bar: Bar
  load: number
}
type Choose = (open: Filled[], size: number, capacity: number) => Filled | undefined

const firstThatFits: Choose = (open, size, capacity) => open.find(({ load }) => fits(load + size, capacity))

const fullestThatFits: Choose = (open, size, capacity) =>
  open
    .filter(({ load }) => fits(load + size, capacity))
    .reduce<Filled | undefined>((best, bar) => (best && best.load >= bar.load ? best : bar), undefined)

/** Longest piece first, each into the bar that `choose` picks, else into a new one. */
function fillDecreasing({ sizes, counts, capacity }: Sizes, choose: Choose): Bar[] {
  const open: Filled[] = []
  for (const index of eachPiece(counts)) {
    const size = sizes[index] ?? 0
    const place = choose(open, size, capacity)
    if (place) {
      place.bar.push(index)
      place.load += size
    } else open.push({ bar: [index], load: size })
  }
  return open.map(({ bar }) => bar)
}

/** A good packing at once: each longest piece into the first bar it fits, or into the fullest, whichever is fewer. */
export function quickPacking(packing: Sizes): Bar[] {
  const first = fillDecreasing(packing, firstThatFits)
  const fullest = fillDecreasing(packing, fullestThatFits)
  return fullest.length < first.length ? fullest : first
}
