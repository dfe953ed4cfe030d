import type { Field, Fields, Precision } from '@/lib/calculators/fields'
import type { Output, Outputs, OutputValue } from '@/lib/calculators/outputs'
import { valueText } from '@/lib/calculators/text'

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
/** A thing of a list goes by its mark where it has one: Part B, Bracket 2. */
function named(label: string, item: unknown, i: number): string {
  const { mark } = asRecord(item)
  return `${label.replace(/s$/, '')} ${typeof mark === 'string' ? mark : i + 1}`
}

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
        ? value.flatMap((item: unknown, i) => fieldLeaves(field.of, item, named(label, item, i), `${path}[${i}]`))
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
    return value.flatMap((item: unknown, i) => solvedLeaves(of, item, named(label, item, i), `${path}[${i}]`))
  }
  if (output.kind === 'group') return outputLeaves(output.of, value, label, path)
  return output.kind === 'value' && isPlain(value) ? [{ path, label, value, shown: output }] : []
}

/** A value as it stands on the sheet: rounded to tape and dial where it is read there. */
export function readsAs({ value, shown }: Leaf, precision: Precision): string {
  if (shown) return valueText(shown, value, precision)
  return typeof value === 'number' ? String(Number(value.toFixed(4))) : String(value)
}

/** What reads differently in the two, in the order of the older one, new ones last. */
export function changesOf(before: readonly Leaf[], after: readonly Leaf[], precision: Precision): Change[] {
  const later = new Map(after.map((leaf) => [leaf.path, leaf]))
  const earlier = new Set(before.map(({ path }) => path))
  const reads = (leaf: Leaf | undefined) => leaf && readsAs(leaf, precision)
  return [
    ...before.map((leaf) => ({ path: leaf.path, label: leaf.label, before: leaf, after: later.get(leaf.path) })),
    ...after
      .filter(({ path }) => !earlier.has(path))
      .map((leaf) => ({ path: leaf.path, label: leaf.label, before: undefined, after: leaf })),
  ].filter((change) => reads(change.before) !== reads(change.after))
}
