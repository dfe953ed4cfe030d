import type { AnyCalculator } from '@/lib/calculators/define'
import { loadCalculator, type CalculatorId } from '@/lib/calculators/load'
import type { Drawing } from '@/lib/drawing/sketch'
import { loadDrawing } from '../drawing/load'

/** What a page needs of its one calculator. */
export interface Parts {
  calculator: AnyCalculator
  draw: Drawing | null
}

const loaded = new Map<CalculatorId, Promise<Parts>>()

/** Fetches entry and drawing side by side; the same promise each time, so that a render may wait for it. */
export function loadParts(id: CalculatorId): Promise<Parts> {
  const known = loaded.get(id)
  if (known) return known
  const parts = Promise.all([loadCalculator(id), loadDrawing(id)]).then(([calculator, draw]) => ({ calculator, draw }))
  loaded.set(id, parts)
  return parts
}
