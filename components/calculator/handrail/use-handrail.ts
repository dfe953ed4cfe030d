'use client'

import { useMemo, useSyncExternalStore } from 'react'
import { answer as answerOf, standing } from '@/lib/calculators/answer'
import { asAny, type AnyCalculator, type Caution, type Values } from '@/lib/calculators/define'
import { handrail } from '@/lib/calculators/field/handrail'
import type { Precision } from '@/lib/calculators/fields'
import type { Preferences } from '@/lib/schemas/account'
import { precisionOf } from '@/lib/schemas/precision'
import type { HandrailInputs, HandrailOutputs } from '@/lib/trade/rail/types'
import { usePreferences } from '../../ui/use-preferences'
import type { RawInputs } from '../address'
import { useStanding, type Standing } from '../use-standing'
import { inputsOf, measureFromInputs } from './measure-inputs'
import { measureStore, type Kept, type MeasureStore } from './measure-store'

const calculator = asAny(handrail)
const exampleMeasure = measureFromInputs(handrail.example)
/** The sheet of the handbook's own page. */
export const pageStore = measureStore(exampleMeasure)

/** A sheet filled from inputs as a saved cut sheet keeps them. */
export const savedStore = (inputs: RawInputs): MeasureStore => measureStore(measureFromInputs(inputs), true)

export const useKept = (store: MeasureStore): Kept => useSyncExternalStore(store.subscribe, store.now, store.atFirst)
const none: readonly Caution<Values, Values>[] = []

/** The rail that is drawn: what was given for it and what came out. */
export interface Rail {
  given: HandrailInputs
  solved: HandrailOutputs
}

export interface HandrailState extends Standing, Kept {
  calculator: AnyCalculator
  store: MeasureStore
  raw: RawInputs
  rail: Rail | null
  precision: Precision
  preferences: Preferences
  cautions: readonly Caution<Values, Values>[]
}

/** The handrail at work: the field sheet as typed, the rail that follows from it, and how this reader reads it. */
export function useHandrail(store: MeasureStore): HandrailState {
  const kept = useKept(store)
  const preferences = usePreferences()
  const precision = useMemo(() => precisionOf(preferences), [preferences])
  const raw = useMemo(() => inputsOf(kept.measure), [kept.measure])
  const stand = useStanding(useMemo(() => answerOf(calculator, raw, precision), [raw, precision]))
  const { answer } = stand
  const rail = useMemo(
    () =>
      answer && {
        given: answer.inputs as unknown as HandrailInputs,
        solved: answer.outputs as unknown as HandrailOutputs,
      },
    [answer],
  )
  const cautions = useMemo(() => (answer ? standing(calculator, answer.inputs, answer.outputs) : none), [answer])
  return { ...kept, ...stand, calculator, store, raw, rail, precision, preferences, cautions }
}
