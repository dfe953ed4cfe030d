'use client'

import { useMemo, useSyncExternalStore } from 'react'
import { readPlace, type SheetPlace } from './sheet-place'

const never = () => () => undefined

/** What the address of the page on the screen says; a page made ahead was opened for no job. */
export function useSheetPlace(): SheetPlace | null {
  const search = useSyncExternalStore(
    never,
    () => location.search,
    () => '',
  )
  return useMemo(() => readPlace(search), [search])
}
