/** Lines of a list and back: `3 × 74 1/2` is three of them; a bare measure is one. */

const counted = /^\s*(\d{1,3})\s*(?:[x×*@\t]|pcs?\b|of\b)\s*(.+)$/i
/** More than the longest list an entry takes: enough for the engine to say that it is too long. */
const mostItems = 1000

/** Items of a text, one a line or parted by semicolons; empty lines are passed over. */
export function readList(text: string): string[] {
  const items: string[] = []
  for (const { item, count } of linesOf(text)) {
    for (let i = 0; i < count && items.length < mostItems; i++) items.push(item)
  }
  return items
}

/** The line (from 1) that an item (from 0) stands on. */
export function lineOfItem(text: string, index: number): number {
  let passed = 0
  for (const { line, count } of linesOf(text)) {
    passed += count
    if (index < passed) return line
  }
  return 1
}

/** Items as lines, neighbours alike counted together. */
export function writeList(items: readonly string[]): string {
  const lines: { item: string; count: number }[] = []
  for (const item of items) {
    const last = lines.at(-1)
    if (last?.item === item) last.count++
    else lines.push({ item, count: 1 })
  }
  return lines.map(({ item, count }) => (count === 1 ? item : `${count} × ${item}`)).join('\n')
}

function linesOf(text: string): { line: number; item: string; count: number }[] {
  return text.split('\n').flatMap((row, i) =>
    row.split(';').flatMap((part) => {
      if (part.trim() === '') return []
      const [, count, item] = counted.exec(part) ?? []
      return [{ line: i + 1, item: (item ?? part).trim(), count: Number(count ?? 1) }]
    }),
  )
}
