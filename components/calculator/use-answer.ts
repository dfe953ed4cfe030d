'use client'

import { useMemo, useState } from 'react'
import { answer, type Answer, type Answered } from '@/lib/calculators/answer'
import type { AnyCalculator } from '@/lib/calculators/define'
import type { Precision } from '@/lib/calculators/fields'
import type { Fault } from '@/lib/calculators/read'
import type { RawInputs } from './address'
import { useAnswerAside } from './use-answer-aside'

/** Past so many pieces a search may take long enough to be felt. */
const longList = 20

export const isLong = (raw: RawInputs) =>
  Object.values(raw).some((value) => Array.isArray(value) && value.length > longList)

export interface Standing {
  /** The answer to show: of these inputs, or while they cannot be read, the last one that could. */
  answer: Answer | null
  /** True while the answer shown is not of the inputs shown. */
  stale: boolean
  /** Being worked out aside. */
  waiting: boolean
  faults: readonly Fault[]
}

/** The answer to what is typed, the moment it can be computed; a long list is worked out in a worker. */
export function useAnswer(calculator: AnyCalculator, raw: RawInputs, precision: Precision): Standing {
  const long = isLong(raw)
  const here = useMemo(() => (long ? null : answer(calculator, raw, precision)), [long, calculator, raw, precision])
  const aside = useAnswerAside(calculator.id, long ? raw : null, precision)
  const now: Answered | null = here ?? aside
  const [last, setLast] = useState<Answer | null>(null)
  const good = now?.ok ? now.answer : null
  if (good && good !== last) setLast(good)
  return {
    answer: good ?? last,
    stale: good === null,
    waiting: now === null,
    faults: now && !now.ok ? now.errors : [],
  }
}
