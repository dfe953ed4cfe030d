/** A plain number, a fraction, or a whole number with a fraction, with no unit. */
const plain = /^(?:\d+(?:\.\d*)?|\.\d+)$/
const fraction = /^(\d+) ?\/ ?(\d+)$/
const mixed = /^(\d+)(?: ?- ?| )(\d+) ?\/ ?(\d+)$/

/** Reads `74.5`, `1/4`, `2 1/2`, `2-1/2` (unsigned). Undefined for anything else; a fraction over nothing is not a number. */
export function readUnsigned(text: string): number | undefined {
  if (plain.test(text)) return finite(Number(text))
  const part = fraction.exec(text)
  if (part) return ratio(part[1], part[2])
  const both = mixed.exec(text)
  const rest = both ? ratio(both[2], both[3]) : undefined
  return both && rest !== undefined && rest < 1 ? finite(Number(both[1]) + rest) : undefined
}

/** Splits a leading sign off. */
export function signed(text: string): { sign: 1 | -1; rest: string } {
  const match = /^([+-])\s?(?![+-])/.exec(text)
  if (!match) return { sign: 1, rest: text }
  return { sign: match[1] === '-' ? -1 : 1, rest: text.slice(match[0].length) }
}

function ratio(top: string | undefined, bottom: string | undefined): number | undefined {
  const below = Number(bottom)
  return below === 0 ? undefined : finite(Number(top) / below)
}

const finite = (value: number) => (Number.isFinite(value) ? value : undefined)
