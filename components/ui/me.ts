'use client'

import { useSyncExternalStore } from 'react'
import { send } from '@/lib/queries/send'
import type { Me } from '@/lib/schemas/views'
import { keepPreferences } from './preferences-store'

/** Undefined until asked; null when nobody is signed in, or when the answer did not come. */
let me: Me | null | undefined
let asked = false
const listeners = new Set<() => void>()

async function ask(): Promise<void> {
  me = await fetchMe()
  if (me) keepPreferences(me.preferences)
  for (const listener of listeners) listener()
}

async function fetchMe(): Promise<Me | null> {
  try {
    return await send<Me | null>('GET', '/api/me')
  } catch {
    return null
  }
}

function subscribe(listener: () => void): () => void {
  listeners.add(listener)
  if (!asked) {
    asked = true
    void ask()
  }
  return () => listeners.delete(listener)
}

/** Who is signed in, asked once a visit by open pages, which know no cookie. */
export const useMe = (): Me | null | undefined =>
  useSyncExternalStore(
    subscribe,
    () => me,
    () => undefined,
  )

/** Asks again, after signing in or out. */
export const refreshMe = ask
