import { normalise } from './normalise'
import { readUnsigned, signed } from './number'
import { readAngle } from './read-angle'
import { readLength, type Read } from './read-length'
import { readSlope } from './read-slope'

/** Suffixes people write after a number whose unit is already known. */
const suffixes: Record<string, RegExp> = {
  mm: /\s?mm$/,
  in2: /\s?(?:in2|in\^2|sq\.? ?in\.?)$/,
  lb: /\s?(?:lbs?\.?|pounds?)$/,
  'lb/h': /\s?(?:lbs?\.?|pounds?)\s?(?:\/|per|an)\s?(?:h|hr|hour)$/,
  min: /\s?(?:min\.?|minutes?)$/,
  '%': /\s?(?:%|percent)$/,
}

/**
 * Reads a quantity as a person writes it, in the unit of the contract (inches, degrees, inches per foot …).
 * A bare number is in that unit. What is ambiguous or senseless is refused with what would be accepted.
 */
export function readQuantity(raw: number | string, unit: string): Read {
  if (typeof raw === 'number')
    return Number.isFinite(raw) ? { value: raw } : { misread: 'give a number that can be measured.' }
  const text = normalise(raw)
  if (text === undefined) return { misread: 'that is too long for one measure.' }
  if (text === '') return { misread: 'give a number.' }
  if (text.includes(',')) return { misread: 'a comma could be thousands or a decimal; write 1892 or 1.5.' }
  const read = readIn(text, unit)
  return 'value' in read && !Number.isFinite(read.value) ? { misread: 'that number is too large to work with.' } : read
}

function readIn(text: string, unit: string): Read {
  if (unit === 'in') return readLength(text)
  if (unit === 'deg') return readAngle(text)
  if (unit === 'in/ft') return readSlope(text)
  return readPlain(text, unit)
}

function readPlain(text: string, unit: string): Read {
  const { sign, rest } = signed(text)
  const value = readUnsigned(rest.replace(suffixes[unit] ?? /$^/, ''))
  return value === undefined ? { misread: 'give a number, such as 12, 0.93 or 1/2.' } : { value: sign * value }
}
