'use client'

import { useEffect, useSyncExternalStore } from 'react'

const key = 'longpoint.last-used'
const most = 6
const nothing: readonly string[] = []
let kept: readonly string[] | undefined

/** Ids last used on this device, the latest first. Storage may be refused: then there are none. */
function read(): readonly string[] {
  try {
    const value: unknown = JSON.parse(localStorage.getItem(key) ?? '[]')
    return Array.isArray(value) ? value.filter((id): id is string => typeof id === 'string').slice(0, most) : nothing
  } catch {
    return nothing
  }
}

/** Remembers that this calculator was opened. */
export function useLastUsed(id: string): void {
  useEffect(() => {
    kept = [id, ...read().filter((other) => other !== id)].slice(0, most)
    try {
      localStorage.setItem(key, JSON.stringify(kept))
    } catch {
      // A device that keeps nothing shows the plain order.
    }
  }, [id])
}

export const useLastUsedIds = (): readonly string[] =>
  useSyncExternalStore(
    () => () => undefined,
    () => (kept ??= read()),
    () => nothing,
  )
