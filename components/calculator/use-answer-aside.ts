'use client'

import { useEffect, useState } from 'react'
import type { Answered } from '@/lib/calculators/answer'
import type { Precision } from '@/lib/calculators/fields'
import { isCalculatorId } from '@/lib/calculators/load'
import type { RawInputs } from './address'
import type { Asked } from './answer-worker'

const startWorker = () => new Worker(new URL('./answer-worker.ts', import.meta.url), { type: 'module' })

/** The worker's answer to these inputs, or null until it comes. `raw` null asks nothing and starts nothing. */
export function useAnswerAside(id: string, raw: RawInputs | null, precision: Precision): Answered | null {
  const [said, setSaid] = useState<{ raw: RawInputs; precision: Precision; answered: Answered } | null>(null)
  const { tape, dial } = precision

  useEffect(() => {
    if (!raw || !isCalculatorId(id)) return
    const asked: Asked = { id, raw, precision: { tape, dial } }
    const worker = startWorker()
    worker.addEventListener('message', ({ data }: MessageEvent<Answered>) =>
      setSaid({ raw, precision: asked.precision, answered: data }),
    )
    worker.postMessage(asked)
    // A worker in mid-search cannot hear: it is ended, and a fresh one asked.
    return () => worker.terminate()
  }, [id, raw, tape, dial])

  const fresh = said && said.raw === raw && said.precision.tape === tape && said.precision.dial === dial
  return fresh ? said.answered : null
}
