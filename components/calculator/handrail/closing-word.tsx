'use client'

import { showTape } from '@/lib/trade/quantity/tape'
import type { Closing } from '@/lib/trade/rail/types'
import { Tape } from '../../ui/tape'
import { useFieldSheet } from './sheet-context'

/** Whether the three tapes of a flight close, in a sentence. */
export function closingText({ error, verdict }: Closing, den: number): string {
  const off = showTape(Math.abs(error), den)
  if (verdict === 'measure again') return `Measure again: the three tapes do not close by ${off}.`
  return off === '0"' ? 'The three tapes close.' : `The three tapes close within ${off}.`
}

export function ClosingWord({ closing }: { closing: Closing }) {
  const { precision } = useFieldSheet()
  const again = closing.verdict === 'measure again'
  const size = Math.abs(closing.error)
  const nothing = size * precision.tape < 0.5
  return (
    <p className="closing-word" data-off={again || undefined}>
      {again ? 'Measure again: the three tapes do not close by ' : 'The three tapes close'}
      {!again && !nothing && ' within '}
      {(again || !nothing) && <Tape inches={size} den={precision.tape} />}.
    </p>
  )
}
