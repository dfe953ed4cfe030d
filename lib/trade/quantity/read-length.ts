import { readUnsigned, signed } from './number'

export type Read = { value: number } | { misread: string }

const accepted = 'Write it as a tape reads, such as 6\' 2 1/2", 74-1/2 in, 74.5 or 1892 mm.'

const metric: Record<string, number> = { mm: 1, cm: 10, m: 1000 }
const inchMark = /\s?(?:"|in\.?|inch|inches)$/
const feetMark = /^(.+?)\s?(?:'|ft\.?|feet|foot)(?=$|[\s\d.-])/

/** Reads a length, in inches, from text that `normalise` brought to one form. */
export function readLength(text: string): Read {
  if (/\d\s?(?:°|deg)/.test(text)) return { misread: `that is an angle; a length is wanted. ${accepted}` }
  const { sign, rest } = signed(text)
  const unsigned = readMetric(rest) ?? readFeet(rest) ?? readInches(rest)
  return 'value' in unsigned ? { value: sign * unsigned.value } : unsigned
}

function readMetric(text: string): Read | undefined {
  const match = /^(.*?)\s?(mm|cm|m)$/.exec(text)
  if (!match) return undefined
  const [, digits = '', unit = ''] = match
  const value = digits.includes('/') ? undefined : readUnsigned(digits)
  if (value === undefined) return { misread: `give ${unit} as a decimal, such as 1892 mm.` }
  // 25.4 is 127/5: divided so, 38.1 mm is 1.5 in and not a hair more.
  return { value: (value * (metric[unit] ?? 1) * 5) / 127 }
}

function readFeet(text: string): Read | undefined {
  const match = feetMark.exec(text)
  if (!match) return undefined
  const feet = readUnsigned(match[1] ?? '')
  const after = text.slice(match[0].length)
  const rest = after.replace(/^\s?-?\s?/, '')
  if (feet === undefined) return { misread: `the feet cannot be read. ${accepted}` }
  if (after === '') return { value: feet * 12 }
  if (!Number.isInteger(feet))
    return { misread: 'feet with a fraction and inches as well could mean two things; give whole feet and inches.' }
  const inches = readUnsigned(rest.replace(inchMark, ''))
  if (inches === undefined) return { misread: `the inches after the feet cannot be read. ${accepted}` }
  if (inches >= 12) return { misread: 'after feet, the inches run from 0 to under 12. Check the reading.' }
  return { value: feet * 12 + inches }
}

function readInches(text: string): Read {
  if (/^\d+ \d+$/.test(text))
    return {
      misread: 'two numbers side by side could be feet and inches or something else; mark them, such as 6\' 2".',
    }
  const value = readUnsigned(text.replace(inchMark, ''))
  return value === undefined ? { misread: accepted } : { value }
}
