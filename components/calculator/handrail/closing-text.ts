import { showTape } from '@/lib/trade/quantity/tape'
import type { Closing } from '@/lib/trade/rail/types'

/** Whether the three tapes of a flight close, in a sentence. */
export function closingText({ error, verdict }: Closing, den: number): string {
  const off = showTape(Math.abs(error), den)
  if (verdict === 'measure again') return `Measure again: the three tapes do not close by ${off}.`
  return off === '0"' ? 'The three tapes close.' : `The three tapes close within ${off}.`
}
