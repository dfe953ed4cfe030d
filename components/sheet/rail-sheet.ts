import type { Answer } from '@/lib/calculators/answer'
import { cutSheetOf } from '@/lib/print/sheet/cut-sheet'
import type { Sheet, SheetHead, SheetReading } from '@/lib/print/sheet/sheet'
import type { HandrailInputs, HandrailOutputs } from '@/lib/trade/rail/types'
import { measureQuery } from '../calculator/handrail/measure-address'
import { measureFromInputs } from '../calculator/handrail/measure-inputs'
import type { RawInputs } from '../calculator/address'
import { draw } from '../drawing/handrail'
import { drawSticks } from '../drawing/handrail-sticks'

export interface SheetOfAnswer {
  head: SheetHead
  answer: Pick<Answer, 'inputs' | 'outputs'>
  reading: SheetReading
  /** Where the sheet is found again, with its origin. */
  address: string
}

/** The drawings of a rail on its sheet: in elevation, and the sticks where stock was given. */
export function railSketches({ answer, reading }: Pick<SheetOfAnswer, 'answer' | 'reading'>) {
  const given = answer.inputs as unknown as HandrailInputs
  const solved = answer.outputs as unknown as HandrailOutputs
  const show = { ...reading.precision, metric: reading.preferences.units === 'mm', detail: 'full' as const }
  return { elevation: draw(given, solved, show), sticks: drawSticks(given, solved, show) }
}

/** The cut sheet of a rail with its drawings, which may have been made before. */
export function railSheet(parts: SheetOfAnswer, sketches = railSketches(parts)): Sheet {
  const { answer, ...rest } = parts
  const given = answer.inputs as unknown as HandrailInputs
  const solved = answer.outputs as unknown as HandrailOutputs
  return cutSheetOf({ ...rest, given, solved, ...sketches })
}

/** Path of the handbook's page with this measure on it. */
export const railPath = (inputs: RawInputs): string => `/handbook/handrail${measureQuery(measureFromInputs(inputs))}`
