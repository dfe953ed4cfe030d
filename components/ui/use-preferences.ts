'use client'

import { useSyncExternalStore } from 'react'
import type { Preferences } from '@/lib/schemas/account'
import { preferencesAtFirst, preferencesNow, subscribePreferences } from './preferences-store'

/** How this reader reads tape, dial and screen; kept on the device, and with the account when signed in. */
export const usePreferences = (): Preferences =>
  useSyncExternalStore(subscribePreferences, preferencesNow, preferencesAtFirst)
