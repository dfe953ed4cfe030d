'use client'

import { useSyncExternalStore } from 'react'

const never = () => () => undefined

/** False in the page as it was made, true once its scripts have taken it over. */
export const useHydrated = (): boolean =>
  useSyncExternalStore(
    never,
    () => true,
    () => false,
  )
