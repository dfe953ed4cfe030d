/** Longer than any measure a person writes. */
const longest = 60

const vulgar: Record<string, string> = {
  '½': '1/2',
  '⅓': '1/3',
  '⅔': '2/3',
  '¼': '1/4',
  '¾': '3/4',
  '⅕': '1/5',
  '⅖': '2/5',
  '⅗': '3/5',
  '⅘': '4/5',
  '⅙': '1/6',
  '⅚': '5/6',
  '⅐': '1/7',
  '⅛': '1/8',
  '⅜': '3/8',
  '⅝': '5/8',
  '⅞': '7/8',
  '⅑': '1/9',
  '⅒': '1/10',
}

/**
 * Brings what keyboards, phones and copied text write for the same thing to one form: straight marks, a hyphen for
 * minus, single blanks, small letters, fractions written out. Undefined when it is longer than any measure.
 */
export function normalise(text: string): string | undefined {
  if (text.length > longest) return undefined
  return text
    .replace(/[½⅓⅔¼¾⅕⅖⅗⅘⅙⅚⅐⅛⅜⅝⅞⅑⅒]/g, (mark) => ` ${vulgar[mark] ?? mark}`)
    .replace(/[\u200b-\u200f\u2060\ufeff]/g, '')
    .replace(/[″“”„‟˝]|′′|''/g, '"')
    .replace(/[′‘’‚‛´`]/g, "'")
    .replace(/[−–—‐‑‒﹣－]/g, '-')
    .replace(/º|˚/g, '°')
    .normalize('NFKC')
    .replace(/\u2044/g, '/')
    .replace(/\s+/g, ' ')
    .trim()
    .toLowerCase()
}
