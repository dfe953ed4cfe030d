'use client'

import type { Closing } from '@/lib/trade/rail/types'
import { Tape } from '../../ui/tape'
import { useFieldSheet } from './sheet-context'

/** Whether the three tapes of a flight close, the fraction set as one. */
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
