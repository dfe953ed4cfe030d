import type { Fault } from '@/lib/calculators/read'
import { fieldAt, inSheetWords } from './fields-at'
import { hasOneSize, textAt, type Measure } from './measure'
import { shownPaths } from './shown-paths'

/** What is off at a box of the sheet. */
export interface PlacedFault extends Fault {
  /** True where nothing is written yet: not wrong, only to come. */
  missing: boolean
}

/** Faults in the order of the sheet, in words that stand by themselves beside a box. */
export function placedFaults(measure: Measure, faults: readonly Fault[]): PlacedFault[] {
  const paths = shownPaths(measure)
  const rank = ({ field }: Fault) => (paths.includes(field) ? paths.indexOf(field) : paths.length)
  return faults
    .filter(({ field }) => field !== 'section.width' || !hasOneSize(measure))
    .map((fault) => placed(measure, fault))
    .sort((a, b) => rank(a) - rank(b))
}

function placed(measure: Measure, { field, message }: Fault): PlacedFault {
  const [, index] = /^brackets\.field\[(\d+)\]$/.exec(field) ?? []
  if (index !== undefined) return { field, message: `Number ${Number(index) + 1}. ${message}`, missing: false }
  const asked = fieldAt(measure, field)
  const isBox = asked !== undefined && (asked.kind === 'quantity' || asked.kind === 'whole' || asked.kind === 'list')
  const missing = isBox && textAt(measure, field).trim() === ''
  const said = inSheetWords(measure, field, message)
  // The first measure of a flight is sent as a blank when it is empty: it is missing, not misread.
  const blank = missing && said === `${asked.label}: give a number.`
  return { field, message: blank ? `${asked.label} is needed here.` : said, missing }
}
