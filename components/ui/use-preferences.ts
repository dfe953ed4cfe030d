'use client'

import { useSyncExternalStore } from 'react'
import type { Precision } from '@/lib/calculators/fields'
import type { Preferences } from '@/lib/schemas/account'
import { preferencesAtFirst, preferencesNow, subscribePreferences } from './preferences-store'

/** How this reader reads tape, dial and screen; kept on the device, and with the account when signed in. */
export const usePreferences = (): Preferences =>
  useSyncExternalStore(subscribePreferences, preferencesNow, preferencesAtFirst)

/** The reader's tape and dial, as the calculators ask for them. */
export const precisionOf = ({ tape, dialStep }: Preferences): Precision => ({ tape, dial: dialStep })
