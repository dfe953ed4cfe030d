import { readUnsigned, signed } from './number'
import type { Read } from './read-length'

const accepted = "Write degrees, such as 32.5, 32 1/2 deg or 32° 30'."
const degreeMark = /\s?(?:°|deg\.?|degree|degrees)$/
/** A slope in 12 of run, as framing squares have it; no dial is graduated in twelfths. */
const inTwelve = /^\d+(?:\.\d+)? ?\/ ?12$/
const parts = /^(\d+)\s?°\s?(\d+(?:\.\d+)?)\s?'(?:\s?(\d+(?:\.\d+)?)\s?")?$/

/** Reads an angle, in degrees, from text that `normalise` brought to one form. */
export function readAngle(text: string): Read {
  const { sign, rest } = signed(text)
  const bySixtieths = parts.exec(rest)
  if (bySixtieths) return sixtieths(sign, bySixtieths)
  if (/\d\s?(?:mm|cm|m|in|inch|inches|ft|'|")$/.test(rest))
    return { misread: `that is a length; an angle is wanted. ${accepted}` }
  if (inTwelve.test(rest)) return { misread: `${rest} could be inches in 12 of run or a part of a degree. ${accepted}` }
  const value = readUnsigned(rest.replace(degreeMark, ''))
  return value === undefined ? { misread: accepted } : { value: sign * value }
}

function sixtieths(sign: 1 | -1, [, degrees, minutes = '0', seconds = '0']: RegExpExecArray): Read {
  if (Number(minutes) >= 60 || Number(seconds) >= 60)
    return { misread: 'minutes and seconds of a degree run from 0 to under 60.' }
  return { value: sign * (Number(degrees) + Number(minutes) / 60 + Number(seconds) / 3600) }
}
