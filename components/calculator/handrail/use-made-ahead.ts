'use client'

import { useEffect, useState } from 'react'
import type { Preferences } from '@/lib/schemas/account'
import { preferencesAtFirst } from '../../ui/preferences-store'
import { useHydrated } from '../../ui/use-hydrated'
import { usePhone } from '../use-phone'
import { wake } from './awake'
import type { Origin } from './measure-store'

/** Wakes the drawing at once where the one made ahead is not for this reader: another measure, tape, unit or screen. */
export function useMadeAhead(origin: Origin, preferences: Preferences): void {
  const hydrated = useHydrated()
  const [ahead] = useState(!hydrated)
  const phone = usePhone()
  const usual = preferencesAtFirst()
  const same =
    preferences.tape === usual.tape &&
    preferences.dialStep === usual.dialStep &&
    preferences.sawSquare === usual.sawSquare &&
    preferences.units === usual.units
  const stands = ahead && !phone && same && origin === 'example'
  useEffect(() => {
    if (!stands) wake()
  }, [stands])
}
