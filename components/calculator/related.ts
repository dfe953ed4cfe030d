import type { Fields } from '@/lib/calculators/fields'
import { writeAddress, type RawInputs } from './address'

/** A calculator that people go on to. */
export interface Related {
  id: string
  name: string
  asks: string
  /** Its inputs that this calculator has too, under the same name and in the same unit. */
  shares: readonly string[]
}

/** The names two calculators share as the same kind of measure. */
export function sharedInputs(from: Fields, to: Fields): string[] {
  return Object.entries(to).flatMap(([name, field]) => {
    const own = from[name]
    const alike = own?.kind === field.kind && ('unit' in field && own && 'unit' in own ? own.unit === field.unit : true)
    return own && alike ? [name] : []
  })
}

/** Its address, with the numbers it shares filled in. */
export function relatedHref({ id, shares }: Related, fields: Fields, raw: RawInputs): string {
  const carried = Object.fromEntries(
    shares.filter((name) => raw[name] !== undefined && raw[name] !== '').map((name) => [name, raw[name]]),
  )
  return `/handbook/${id}${writeAddress(fields, carried)}`
}
