'use client'

import { use, useMemo } from 'react'
import { standing } from '@/lib/calculators/answer'
import type { AnyCalculator, Caution, Values } from '@/lib/calculators/define'
import type { Precision } from '@/lib/calculators/fields'
import type { CalculatorId } from '@/lib/calculators/load'
import type { Drawing } from '@/lib/drawing/sketch'
import type { Preferences } from '@/lib/schemas/account'
import { precisionOf } from '@/lib/schemas/precision'
import { usePreferences } from '../ui/use-preferences'
import type { RawInputs } from './address'
import { loadParts } from './parts'
import { useAddressInputs } from './use-address-inputs'
import { useAnswer } from './use-answer'
import type { Standing } from './use-standing'

/** A calculator at work: what is typed, what comes out, and how this reader reads it. */
export interface BenchState extends Standing {
  calculator: AnyCalculator
  draw: Drawing | null
  raw: RawInputs
  set: (change: RawInputs) => void
  preferences: Preferences
  /** The reader's own tape and dial. */
  asked: Precision
  /** The tape and dial of this answer: an entry with a step of its own reads by that. */
  precision: Precision
  cautions: readonly Caution<Values, Values>[]
}

const none: readonly Caution<Values, Values>[] = []

export function useBench(id: CalculatorId): BenchState {
  const { calculator, draw } = use(loadParts(id))
  const preferences = usePreferences()
  const [raw, set] = useAddressInputs(calculator.inputs, calculator.example)
  const asked = useMemo(() => precisionOf(preferences), [preferences])
  const stand = useAnswer(calculator, raw, asked)
  const { answer } = stand
  const precision = useMemo(
    () => (answer && calculator.precisionOf?.(answer.inputs, asked)) ?? asked,
    [answer, calculator, asked],
  )
  const cautions = useMemo(
    () => (answer ? standing(calculator, answer.inputs, answer.outputs) : none),
    [answer, calculator],
  )
  return { ...stand, calculator, draw, raw, set, preferences, asked, precision, cautions }
}
