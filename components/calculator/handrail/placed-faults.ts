import type { Fault } from '@/lib/calculators/read'
import { fieldAt } from './fields-at'
import { textAt, type Measure } from './measure'
import { shownPaths } from './shown-paths'

/** Faults in the order of the sheet, in words that stand by themselves beside a box. */
export function placedFaults(measure: Measure, faults: readonly Fault[]): Fault[] {
  const paths = shownPaths(measure)
  const rank = ({ field }: Fault) => (paths.includes(field) ? paths.indexOf(field) : paths.length)
  return faults.map((fault) => worded(measure, fault)).sort((a, b) => rank(a) - rank(b))
}

function worded(measure: Measure, { field, message }: Fault): Fault {
  const [, index] = /^brackets\.field\[(\d+)\]$/.exec(field) ?? []
  if (index !== undefined) return { field, message: `Number ${Number(index) + 1}. ${message}` }
  // The first measure of a flight is sent as a blank when it is empty: it is missing, not misread.
  const asked = fieldAt(measure, field)
  const empty = textAt(measure, field).trim() === '' && asked && message === `${asked.label}: give a number.`
  return { field, message: empty ? `${asked.label} is needed here.` : message }
}
