export interface Tick {
  /** 0 at the start of the inch, 1 at its end. */
  place: number
  length: number
  name?: string
  strong: boolean
}

/** Lengths by how often an inch was halved to get there: whole, half, quarter, eighth … */
const lengths = [38, 29, 23, 18, 13, 9, 6]
const names: Readonly<Record<number, string>> = { 0: '0', 0.25: '1/4', 0.5: '1/2', 0.75: '3/4', 1: '1' }

/** Marks of one inch of tape with `den` divisions, both ends included. */
export function ticksOf(den: number): Tick[] {
  return Array.from({ length: den + 1 }, (_, i) => {
    const place = i / den
    const halvings = halvingsOf(i, den)
    return { place, length: lengths[halvings] ?? 6, name: names[place], strong: halvings <= 1 }
  })
}

/** How often the inch is halved to reach i/den; ends are 0. */
function halvingsOf(i: number, den: number): number {
  if (i % den === 0) return 0
  let halvings = Math.log2(den)
  for (let rest = i; rest % 2 === 0; rest /= 2) halvings--
  return halvings
}
