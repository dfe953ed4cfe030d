'use client'

import { useState } from 'react'
import type { Answer, Answered } from '@/lib/calculators/answer'
import type { Fault } from '@/lib/calculators/read'

export interface Standing {
  /** The answer to show: of these inputs, or while they cannot be read, the last one that could. */
  answer: Answer | null
  /** True while the answer shown is not of the inputs shown. */
  stale: boolean
  /** Being worked out aside. */
  waiting: boolean
  faults: readonly Fault[]
}

/** What to show of an answer that may be a refusal, or still be worked out (null): never nothing where there was one. */
export function useStanding(now: Answered | null): Standing {
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
