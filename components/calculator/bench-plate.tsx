'use client'

import { useDeferredValue, useMemo } from 'react'
import type { Answer } from '@/lib/calculators/answer'
import type { Precision } from '@/lib/calculators/fields'
import type { Drawing } from '@/lib/drawing/sketch'
import { Plate } from '../drawing/plate'
import { usePhone } from './use-phone'

interface BenchPlateProps {
  draw: Drawing
  answer: Answer
  precision: Precision
  metric: boolean
  stale: boolean
  title: string
}

/** The drawing of these very numbers. It may follow a moment after the typing, never hold it up. */
export function BenchPlate({ draw, answer, precision, metric, stale, title }: BenchPlateProps) {
  const phone = usePhone()
  const drawn = useDeferredValue(answer)
  const sketch = useMemo(
    () => draw(drawn.inputs, drawn.outputs, { ...precision, metric, detail: phone ? 'compact' : 'full' }),
    [draw, drawn, precision, metric, phone],
  )
  return (
    <div className="bench-plate" data-stale={stale || undefined}>
      <Plate sketch={sketch} title={title} shape={phone ? 'strip' : 'plate'} />
    </div>
  )
}
