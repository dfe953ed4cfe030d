import type { Field, Fields } from '@/lib/calculators/fields'

/** Inputs as typed: text for one value, and for the rest the tree that the entry asks for. */
export type RawInputs = Readonly<Record<string, unknown>>

/**
 * Inputs out of an address, over what stands there already (the example): what the address does not name stays.
 * What cannot be read is passed over, never refused: a link may be old.
 */
export function readAddress(fields: Fields, search: string, standing: RawInputs): RawInputs {
  const asked = new URLSearchParams(search)
  const found = Object.entries(fields).flatMap(([name, field]) => {
    const text = asked.get(name)
    const value = text === null ? undefined : fromText(field, text)
    return value === undefined ? [] : [[name, value] as const]
  })
  return found.length === 0 ? standing : { ...standing, ...Object.fromEntries(found) }
}

/** The address that brings these inputs back, with the question mark; in the order of the fields, so that it is one for one. */
export function writeAddress(fields: Fields, raw: RawInputs): string {
  const address = new URLSearchParams()
  for (const [name, field] of Object.entries(fields)) {
    if (raw[name] !== undefined && raw[name] !== null) address.set(name, toText(field, raw[name]))
  }
  const text = address.toString()
  return text === '' ? '' : `?${text}`
}

const isPlain = (field: Field) => field.kind === 'quantity' || field.kind === 'whole' || field.kind === 'choice'

function fromText(field: Field, text: string): unknown {
  if (isPlain(field)) return text
  if (field.kind === 'list' && isPlain(field.of)) return text === '' ? [] : text.split(';').map((item) => item.trim())
  try {
    const value: unknown = JSON.parse(text)
    return typeof value === 'object' && value !== null ? value : undefined
  } catch {
    return undefined
  }
}

function toText(field: Field, value: unknown): string {
  if (isPlain(field)) return String(value)
  if (field.kind === 'list' && isPlain(field.of) && Array.isArray(value)) return value.map(String).join(';')
  return JSON.stringify(value)
}
