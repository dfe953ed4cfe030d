import type { Show, Sketch } from '@/lib/drawing/sketch'
import type { HandrailInputs, HandrailOutputs } from '@/lib/trade/rail/types'
import { draw as drawBars } from './cut-list'

/** The sticks of a rail with its parts laid in them, or null when no stock was given or a part is longer than a stick. */
export function drawSticks(
  { stock: given }: HandrailInputs,
  { stock: solved }: HandrailOutputs,
  show: Show,
): Sketch | null {
  if (!given || !solved) return null
  return drawBars({ stock: given.length, kerf: given.kerf, trim: given.trim }, solved, show)
}
