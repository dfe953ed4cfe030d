'use client'

import { useDeferredValue, useMemo } from 'react'
import type { Answer } from '@/lib/calculators/answer'
import type { AnyCalculator } from '@/lib/calculators/define'
import type { Precision } from '@/lib/calculators/fields'
import { sensitivityOf } from '@/lib/calculators/sensitivity'
import { effectSentence } from './effect-words'

/** What a small slip of each measure does to the answer. */
export function BeingOff({
  calculator,
  answer,
  precision,
}: {
  calculator: AnyCalculator
  answer: Answer
  precision: Precision
}) {
  const inputs = useDeferredValue(answer.inputs)
  const effects = useMemo(() => sensitivityOf(calculator, inputs, precision), [calculator, inputs, precision])
  if (effects.length === 0) return null
  return (
    <section aria-labelledby="being-off">
      <h2 id="being-off">Being off</h2>
      <ul className="being-off">
        {effects.map((effect) => (
          <li key={effect.input}>{effectSentence(effect, calculator)}</li>
        ))}
      </ul>
    </section>
  )
}
