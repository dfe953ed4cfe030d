import 'server-only'
import { readQuantity } from '@/lib/trade/quantity/read'
import type { Read } from '@/lib/trade/quantity/read-length'
import { readExpression } from './expression'

/** Signs that a measure never has: a called name, a parenthesis, a product, a power, a sum. */
const worked = /[a-z]\s?\(|[()*×·÷^+]/i
/** A minus or a stroke between plain numbers, one of them decimal or the minus set apart: `33.7/2`, `90 - 16`. */
const between = /^\d+(?:\.\d+)?(?: ?[-−–/] ?\d+(?:\.\d+)?)+$/
/** `7/12` could be a slope in 12; the reading of angles asks which is meant. */
const fraction = /^\d+ ?\/ ?\d+$/

/**
 * Reads an answer as a person writes it, in inches or degrees: a measure with or without its unit, else a sum.
 * Unreadable text comes back as a sentence, and costs nothing. Called on the server alone: sums bring mathjs along.
 */
export function readAnswer(typed: string, unit: 'in' | 'deg'): Read {
  const measure = readQuantity(typed, unit)
  if ('value' in measure || !looksWorked(typed.trim())) return measure
  return readExpression(typed)
}

const looksWorked = (typed: string) =>
  !typed.includes(',') && !fraction.test(typed) && (worked.test(typed) || between.test(typed))
