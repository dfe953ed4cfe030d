import { readUnsigned, signed } from './number'
import type { Read } from './read-length'

const accepted = 'Write inches per foot, such as 1/4, 1/4 in/ft, 2% or 1:48.'
const perFoot = /\s?(?:(?:"|in\.?|inch|inches)?\s?(?:\/|per)\s?(?:ft\.?|foot)|"|in\.?|inch|inches)$/

/** Reads a slope, in inches per foot, from text that `normalise` brought to one form. */
export function readSlope(text: string): Read {
  if (/\d\s?(?:°|deg)/.test(text)) return { misread: `that is an angle; a slope is wanted. ${accepted}` }
  const { sign, rest } = signed(text)
  const value = readRatio(rest) ?? readPercent(rest) ?? readUnsigned(rest.replace(perFoot, ''))
  return value === undefined ? { misread: accepted } : { value: sign * value }
}

function readRatio(text: string): number | undefined {
  const match = /^(\d+(?:\.\d+)?) ?: ?(\d+(?:\.\d+)?)$/.exec(text)
  return match && Number(match[2]) > 0 ? (12 * Number(match[1])) / Number(match[2]) : undefined
}

function readPercent(text: string): number | undefined {
  const match = /^(\d+(?:\.\d+)?) ?%$/.exec(text)
  return match ? (12 * Number(match[1])) / 100 : undefined
}
