import { createContext, use } from 'react'
import type { Caution, Note, Values } from '@/lib/calculators/define'
import type { Precision } from '@/lib/calculators/fields'
import type { PadState } from '../use-pad'
import type { Measure } from './measure'
import type { MeasureStore } from './measure-store'
import type { PlacedFault } from './placed-faults'

/** What every part of the field sheet works with. */
export interface FieldSheetState {
  measure: Measure
  store: MeasureStore
  faults: readonly PlacedFault[]
  notes: readonly Note[]
  cautions: readonly Caution<Values, Values>[]
  pad: PadState
  phone: boolean
  precision: Precision
}

export const FieldSheetContext = createContext<FieldSheetState | null>(null)

export function useFieldSheet(): FieldSheetState {
  const sheet = use(FieldSheetContext)
  if (!sheet) throw new Error('A part of the field sheet stands outside it.')
  return sheet
}
