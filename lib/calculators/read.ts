import { readQuantity } from '@/lib/trade/quantity/read'
import type { ChoiceField, Field, Fields, FormsField, ListField, Precision, QuantityField, WholeField } from './fields'
import type { Note, Values } from './define'
import { outOfBounds, outOfRange } from './bounds'

/** What is off with one input: the path to it (`flights[0].rise`) and a sentence that says what is accepted. */
export interface Fault {
  field: string
  message: string
}

export type Reading = { ok: true; inputs: Values; notes: Note[] } | { ok: false; faults: Fault[] }

/** Collects faults and notes while a tree of inputs is read. */
interface Reader {
  precision: Precision
  faults: Fault[]
  notes: Note[]
}

/** Naming the first few is enough to see what went wrong. */
const mostUnknown = 10

const isObject = (raw: unknown): raw is Record<string, unknown> =>
  typeof raw === 'object' && raw !== null && !Array.isArray(raw)

const isLeftOut = (raw: unknown) => raw === undefined || raw === null || raw === ''

/**
 * Reads what a person or a program sent into the values that solve receives, in the contract's units.
 * Every wrong field is named once; nothing is guessed.
 */
export function readInputs(fields: Fields, raw: unknown, precision: Precision): Reading {
  const reader: Reader = { precision, faults: [], notes: [] }
  if (!isObject(raw))
    return { ok: false, faults: [{ field: 'inputs', message: 'Send the inputs as an object of names and values.' }] }
  const inputs = readFields(fields, raw, '', reader)
  return reader.faults.length > 0 ? { ok: false, faults: reader.faults } : { ok: true, inputs, notes: reader.notes }
}

function readFields(fields: Fields, raw: Record<string, unknown>, path: string, reader: Reader): Values {
  const unknown = Object.keys(raw).filter((name) => !Object.hasOwn(fields, name))
  for (const name of unknown.slice(0, mostUnknown)) {
    reader.faults.push({ field: join(path, name.slice(0, 40)) || 'inputs', message: unknownName(name, fields) })
  }
  return Object.fromEntries(
    Object.entries(fields).map(([name, field]) => [
      name,
      readField(field, Object.hasOwn(raw, name) ? raw[name] : undefined, join(path, name), reader),
    ]),
  )
}

function readField(field: Field, raw: unknown, path: string, reader: Reader): unknown {
  if (isLeftOut(raw)) {
    if (field.fallback === undefined) return fault(reader, path, `${field.label} is needed here.`)
    return typeof field.fallback === 'function' ? field.fallback(reader.precision) : field.fallback
  }
  switch (field.kind) {
    case 'quantity':
    case 'whole':
      return readNumber(field, raw, path, reader)
    case 'choice':
      return readChoice(field, raw, path, reader)
    case 'list':
      return readList(field, raw, path, reader)
    case 'group':
      if (!isObject(raw)) return fault(reader, path, `${field.label}: give an object with ${names(field.fields)}.`)
      return readFields(field.fields, raw, path, reader)
    case 'forms':
      return readForm(field, raw, path, reader)
  }
}

function readNumber(field: QuantityField | WholeField, raw: unknown, path: string, reader: Reader): number | undefined {
  if (typeof raw !== 'number' && typeof raw !== 'string')
    return fault(reader, path, `${field.label}: give a number or a measure as you would write it.`)
  const read = readQuantity(raw, field.unit)
  if ('misread' in read) return fault(reader, path, `${field.label}: ${read.misread}`)
  const refusal = outOfBounds(field, read.value)
  if (refusal) return fault(reader, path, refusal)
  const warning = outOfRange(field, read.value)
  if (warning) reader.notes.push({ field: path, message: warning })
  return read.value
}

function readChoice(field: ChoiceField, raw: unknown, path: string, reader: Reader): string | number | undefined {
  const asked = typeof raw === 'string' ? raw.trim() : raw
  const found = field.options.find((option) => option === asked || String(option) === asked)
  return found ?? fault(reader, path, `${field.label}: choose one of ${field.options.join(', ')}.`)
}

function readList(field: ListField, raw: unknown, path: string, reader: Reader): unknown[] | undefined {
  if (!Array.isArray(raw)) return fault(reader, path, `${field.label}: give a list.`)
  if (raw.length < field.least) return fault(reader, path, `${field.label}: give at least ${field.least}.`)
  if (raw.length > field.most)
    return fault(reader, path, `${field.label}: at most ${field.most} can be worked at once.`)
  return raw.map((item: unknown, i) => readField(field.of, item, `${path}[${i}]`, reader))
}

function readForm(field: FormsField, raw: unknown, path: string, reader: Reader): Values | undefined {
  const ways = field.forms.map(names).join('; or ')
  if (!isObject(raw)) return fault(reader, path, `${field.label}: give ${ways}.`)
  const given = (fields: Fields) => !isLeftOut(raw[Object.keys(fields)[0] ?? ''])
  const chosen = field.forms.filter(given)
  const [form] = chosen
  if (!form || chosen.length > 1) return fault(reader, path, `${field.label}: give one of these sets: ${ways}.`)
  return readFields(form, raw, path, reader)
}

function fault(reader: Reader, field: string, message: string): undefined {
  reader.faults.push({ field, message })
}

const join = (path: string, name: string) => (path === '' ? name : `${path}.${name}`)
const names = (fields: Fields) => Object.keys(fields).join(', ')
const unknownName = (name: string, fields: Fields) =>
  `There is no input “${name.slice(0, 40)}” here. Known: ${names(fields)}.`
