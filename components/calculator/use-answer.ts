'use client'

import { useMemo } from 'react'
import { answer } from '@/lib/calculators/answer'
import type { AnyCalculator } from '@/lib/calculators/define'
import type { Precision } from '@/lib/calculators/fields'
import type { RawInputs } from './address'
import { useAnswerAside } from './use-answer-aside'
import { useStanding, type Standing } from './use-standing'

/** Past so many pieces a search may take long enough to be felt. */
const longList = 20

export const isLong = (raw: RawInputs) =>
  Object.values(raw).some((value) => Array.isArray(value) && value.length > longList)

/** The answer to what is typed, the moment it can be computed; a long list is worked out in a worker. */
export function useAnswer(calculator: AnyCalculator, raw: RawInputs, precision: Precision): Standing {
  const long = isLong(raw)
  const here = useMemo(() => (long ? null : answer(calculator, raw, precision)), [long, calculator, raw, precision])
  const aside = useAnswerAside(calculator.id, long ? raw : null, precision)
  return useStanding(here ?? aside)
}
