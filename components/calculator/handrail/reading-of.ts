import type { Precision } from '@/lib/calculators/fields'
import type { Preferences } from '@/lib/schemas/account'

/** How this reader reads numbers: tape, dial, units, and what the saw calls square. */
export interface Reading {
  precision: Precision
  preferences: Preferences
}
