import type { Field, Fields } from '@/lib/calculators/fields'
import type { Output, Outputs, OutputValue } from '@/lib/calculators/outputs'

type Plain = number | string | boolean

/** One number or word of a sheet, with the words that lead to it. */
export interface Leaf {
  path: string
  label: string
  value: Plain
  /** How it is read; inputs are read as they stand. */
  shown?: OutputValue
}

/** What differs between two revisions; a side that has no such value is undefined. */
export interface Change {
  path: string
  label: string
  before: Leaf | undefined
  after: Leaf | undefined
}

const isPlain = (value: unknown): value is Plain => ['number', 'string', 'boolean'].includes(typeof value)
const asRecord = (value: unknown): Record<string, unknown> =>
  typeof value === 'object' && value !== null ? (value as Record<string, unknown>) : {}
const joined = (label: string, of: string) =>
  label === '' ? of : `${label}, ${of.charAt(0).toLowerCase()}${of.slice(1)}`
const numbered = (label: string, i: number) => `${label.replace(/s$/, '')} ${i + 1}`

/** Every given value of a sheet. */
export function inputLeaves(fields: Fields, inputs: unknown, label = '', path = ''): Leaf[] {
  const held = asRecord(inputs)
  return Object.entries(fields).flatMap(([name, field]) =>
    fieldLeaves(field, held[name], joined(label, field.label), `${path}.${name}`),
  )
}

function fieldLeaves(field: Field, value: unknown, label: string, path: string): Leaf[] {
  if (value === null || value === undefined) return []
  switch (field.kind) {
    case 'list':
      return Array.isArray(value)
        ? value.flatMap((item: unknown, i) => fieldLeaves(field.of, item, numbered(label, i), `${path}[${i}]`))
        : []
    case 'group':
      return inputLeaves(field.fields, value, label, path)
    case 'forms': {
      const form = field.forms.find(
        (fields) =>
          Object.keys(fields)[0] !== undefined && Object.hasOwn(asRecord(value), Object.keys(fields)[0] ?? ''),
      )
      return form ? inputLeaves(form, value, label, path) : []
    }
    default:
      return isPlain(value) ? [{ path, label, value }] : []
  }
}

/** Every solved value of a sheet that people read. */
export function outputLeaves(outputs: Outputs, solved: unknown, label = '', path = ''): Leaf[] {
  const held = asRecord(solved)
  return Object.entries(outputs).flatMap(([name, output]) =>
    solvedLeaves(output, held[name], joined(label, output.label), `${path}.${name}`),
  )
}

function solvedLeaves(output: Output, value: unknown, label: string, path: string): Leaf[] {
  if (value === null || value === undefined) return []
  if (Array.isArray(value)) {
    const of = output.kind === 'list' ? output.of : output
    return value.flatMap((item: unknown, i) => solvedLeaves(of, item, numbered(label, i), `${path}[${i}]`))
  }
  if (output.kind === 'group') return outputLeaves(output.of, value, label, path)
  return output.kind === 'value' && isPlain(value) ? [{ path, label, value, shown: output }] : []
}

/** Below this two numbers are one: nobody cuts to it. */
const same = 1e-6

/** What stands differently in the two, in the order of the older one, new ones last. */
export function changesOf(before: readonly Leaf[], after: readonly Leaf[]): Change[] {
  const later = new Map(after.map((leaf) => [leaf.path, leaf]))
  const earlier = new Set(before.map(({ path }) => path))
  return [
    ...before.map((leaf) => ({ path: leaf.path, label: leaf.label, before: leaf, after: later.get(leaf.path) })),
    ...after
      .filter(({ path }) => !earlier.has(path))
      .map((leaf) => ({ path: leaf.path, label: leaf.label, before: undefined, after: leaf })),
  ].filter(differs)
}

function differs({ before, after }: Change): boolean {
  if (typeof before?.value === 'number' && typeof after?.value === 'number')
    return Math.abs(before.value - after.value) > same
  return before?.value !== after?.value
}
