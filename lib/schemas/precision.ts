import type { Precision } from '@/lib/calculators/fields'
import type { Preferences } from './account'

/** The reader's tape and dial, as the calculators ask for them. */
export const precisionOf = ({ tape, dialStep }: Pick<Preferences, 'tape' | 'dialStep'>): Precision => ({
  tape,
  dial: dialStep,
})
