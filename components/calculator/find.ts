/** What the list of the handbook knows of a calculator; small enough to go along with the page. */
export interface Listed {
  id: string
  stage: string
  name: string
  asks: string
  alsoCalled: readonly string[]
}

const words = (text: string): string[] =>
  text
    .toLowerCase()
    .normalize('NFKD')
    .replace(/[^a-z0-9/ ]+/g, ' ')
    .split(/\s+/)
    .filter(Boolean)

/** Letters that may be wrong in a word of this length and still mean it. */
const forgiven = (length: number) => (length < 4 ? 0 : length < 8 ? 1 : 2)

/** How far a word as typed is from a known one: 0 where it begins it, 1 for a slip of spelling, none where it is another word. */
function distance(typed: string, known: string): number | undefined {
  if (known.startsWith(typed)) return 0
  const slips = slipsBetween(typed, known.slice(0, Math.max(typed.length, known.length - 2)))
  return Math.min(slips, slipsBetween(typed, known)) <= forgiven(typed.length) ? 1 : undefined
}

/** Letters to add, drop, change or swap with their neighbour to turn one word into the other. */
export function slipsBetween(a: string, b: string): number {
  let before: number[] = []
  let row = Array.from({ length: b.length + 1 }, (_, j) => j)
  for (let i = 1; i <= a.length; i++) {
    const next = [i]
    for (let j = 1; j <= b.length; j++) {
      const change = (row[j - 1] ?? 0) + (a[i - 1] === b[j - 1] ? 0 : 1)
      const swap =
        i > 1 && j > 1 && a[i - 1] === b[j - 2] && a[i - 2] === b[j - 1] ? (before[j - 2] ?? 0) + 1 : Infinity
      next.push(Math.min((row[j] ?? 0) + 1, (next[j - 1] ?? 0) + 1, change, swap))
    }
    before = row
    row = next
  }
  return row[b.length] ?? a.length
}

/** Worse the later the text stands in: the name, what else it is called, the question. */
function rank(query: readonly string[], { name, alsoCalled, asks }: Listed): number | undefined {
  const texts = [words(name), alsoCalled.flatMap(words), words(asks)]
  const places = query.map((typed) => {
    const found = texts.flatMap((known, place) =>
      known.flatMap((word) => distance(typed, word) ?? []).map((slip) => place + slip * 2.5),
    )
    return found.length === 0 ? undefined : Math.min(...found)
  })
  return places.every((place) => place !== undefined)
    ? places.reduce<number>((sum, place) => sum + (place ?? 0), 0)
    : undefined
}

/** The calculators that every word of the query fits, the nearest first; all of them for an empty query. */
export function findCalculators(query: string, all: readonly Listed[]): Listed[] {
  const typed = words(query)
  if (typed.length === 0) return [...all]
  return all
    .flatMap((listed) => {
      const at = rank(typed, listed)
      return at === undefined ? [] : [{ listed, at }]
    })
    .sort((a, b) => a.at - b.at)
    .map(({ listed }) => listed)
}
