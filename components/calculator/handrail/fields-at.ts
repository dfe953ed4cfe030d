import { handrailFields } from '@/lib/calculators/field/handrail-fields'
import type { Field, Fields } from '@/lib/calculators/fields'
import { isNumber, type NumberField } from '../field-kinds'
import { textAt, type Measure } from './measure'

const flightForm = { count: 0, rake: 1, tape: 2 } as const

/** Fields of one set of several, by the way that the measure has chosen there. */
function formOf(measure: Measure, path: string, { forms }: { forms: readonly Fields[] }): Fields | undefined {
  const way = textAt(measure, `${path}.way`)
  if (path === 'brackets') return forms[way === 'field' ? 1 : 0]
  return forms[flightForm[way as keyof typeof flightForm] ?? flightForm.tape]
}

/** What the entry says of the input at a path: label, unit, hint. */
export function fieldAt(measure: Measure, path: string): Field | undefined {
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
