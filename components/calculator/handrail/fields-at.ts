import { handrailFields } from '@/lib/calculators/field/handrail-fields'
import type { Field, Fields } from '@/lib/calculators/fields'
import { isNumber, type NumberField } from '../field-kinds'
import { hasOneSize, textAt, type Measure } from './measure'

const flightForm = { count: 0, rake: 1, tape: 2 } as const

/** Fields of one set of several, by the way that the measure has chosen there. */
function formOf(measure: Measure, path: string, { forms }: { forms: readonly Fields[] }): Fields | undefined {
  const way = textAt(measure, `${path}.way`)
  if (path === 'brackets') return forms[way === 'field' ? 1 : 0]
  return forms[flightForm[way as keyof typeof flightForm] ?? flightForm.tape]
}

/** What the one size of a section is called. */
const sizeLabels: Readonly<Record<string, string>> = { round: 'Outside diameter', square: 'Side, outside' }

/** What the sheet says of the input at a path: label, unit, hint. */
export function fieldAt(measure: Measure, path: string): Field | undefined {
  const field = entryFieldAt(measure, path)
  const label =
    path === 'section.depth' && hasOneSize(measure) ? sizeLabels[textAt(measure, 'section.shape')] : undefined
  return field && label ? { ...field, label } : field
}

/** A sentence of the engine about the input at a path, in the sheet's own words for it. */
export function inSheetWords(measure: Measure, path: string, message: string): string {
  const [entry, sheet] = [entryFieldAt(measure, path), fieldAt(measure, path)]
  return entry && sheet ? message.replace(entry.label, sheet.label) : message
}

function entryFieldAt(measure: Measure, path: string): Field | undefined {
  let at: Field | undefined
  let walked = ''
  for (const step of path.match(/\[\d+\]|[^.[\]]+/g) ?? []) {
    const name = step.startsWith('[') ? null : step
    const inside: Fields | undefined =
      at === undefined
        ? handrailFields
        : at.kind === 'group'
          ? at.fields
          : at.kind === 'forms'
            ? formOf(measure, walked, at)
            : undefined
    at = name === null ? (at?.kind === 'list' ? at.of : undefined) : inside?.[name]
    walked = name === null ? `${walked}${step}` : walked === '' ? name : `${walked}.${name}`
    if (!at) return undefined
  }
  return at
}

/** The number that is asked for at a path, if it is one. */
export function numberAt(measure: Measure, path: string): NumberField | undefined {
  const field = fieldAt(measure, path)
  return field && isNumber(field) ? field : undefined
}

const nameOf = (step: string): string =>
  ({
    bottom: 'Bottom end',
    top: 'Top end',
    section: 'Rail',
    brackets: 'Brackets',
    stock: 'Stock',
    weld: 'Filler',
    code: 'Code rows',
    volutes: 'Volutes',
  })[step] ?? ''

/** Where on the sheet a path stands, in words: "Flight 2", "Landing 1", "Bottom end". */
export function placeOf(path: string): string {
  const [, list, index] = /^(flights|landings)\[(\d+)\]/.exec(path) ?? []
  if (list !== undefined) return `${list === 'flights' ? 'Flight' : 'Landing'} ${Number(index) + 1}`
  return nameOf(path.split(/[.[]/)[0] ?? '') || 'Rail'
}
