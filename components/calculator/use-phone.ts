'use client'

import { useSyncExternalStore } from 'react'

const query = '(max-width: 640px)'

function subscribe(listener: () => void): () => void {
  const list = window.matchMedia(query)
  list.addEventListener('change', listener)
  return () => list.removeEventListener('change', listener)
}

/** True on a screen narrow enough for the pad. Pages rendered ahead take it for a desk. */
export const usePhone = (): boolean =>
  useSyncExternalStore(
    subscribe,
    () => window.matchMedia(query).matches,
    () => false,
  )
