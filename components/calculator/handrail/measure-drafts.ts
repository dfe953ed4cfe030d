import { readMeasure, writeMeasure } from './measure-address'
import { blankMeasure, type Measure } from './measure'

const slots = { now: 'longpoint.handrail-draft', before: 'longpoint.handrail-draft-before' } as const

/** What this device keeps: the measure last worked on, and the one that it took the place of. */
export interface Drafts {
  now: Measure | null
  before: Measure | null
}

export const sameMeasure = (one: Measure, other: Measure): boolean => writeMeasure(one) === writeMeasure(other)
export const isBlank = (measure: Measure): boolean => sameMeasure(measure, blankMeasure)

/** A device that keeps nothing holds the measure in the address only. */
export function readDrafts(): Drafts {
  try {
    const at = (slot: keyof Drafts) => readMeasure(localStorage.getItem(slots[slot]))
    return { now: at('now'), before: at('before') }
  } catch {
    return { now: null, before: null }
  }
}

/** Keeps a measure, or with null forgets the one that was kept there. */
export function keepDraft(slot: keyof Drafts, measure: Measure | null): void {
  try {
    if (measure) localStorage.setItem(slots[slot], writeMeasure(measure))
    else localStorage.removeItem(slots[slot])
  } catch {
    // Nothing is lost while the page stands: the address has it all.
  }
}
