'use client'

import { useCallback, useMemo, useSyncExternalStore } from 'react'
import type { Fields } from '@/lib/calculators/fields'
import { readAddress, writeAddress, type RawInputs } from './address'

/** Browsers refuse an address that changes at every keystroke; the page follows at once, the address a moment later. */
const settleMs = 250
/** By then the router has answered. */
const routerMs = 1500

const listeners = new Set<() => void>()
/** What was typed on the page at `path`; it stands there until one goes elsewhere, whatever becomes of the address bar. */
let ahead: { path: string; search: string } | null = null
let timer: ReturnType<typeof setTimeout> | undefined

/**
 * What was typed on a page that has been left meanwhile is none of this page's. On this page it stands over the address
 * bar: the router answers a changed address later, and may then write an older one over a newer.
 */
const searchNow = () => (ahead?.path === location.pathname ? ahead.search : location.search)

/** Other things that the address says, such as the kept sheet that is being revised, stay. */
function withOthers(fields: Fields, search: string, written: string): string {
  const others = [...new URLSearchParams(search)].filter(([name]) => !Object.hasOwn(fields, name))
  const rest = new URLSearchParams(others).toString()
  if (rest === '') return written
  return written === '' ? `?${rest}` : `${written}&${rest}`
}

function settle(): void {
  if (timer === undefined) return
  clearTimeout(timer)
  timer = undefined
  write()
  setTimeout(write, routerMs)
}

/** Writes what was typed into the address bar, where it does not stand there yet. */
function write(): void {
  if (ahead?.path === location.pathname && ahead.search !== location.search)
    history.replaceState(history.state, '', `${ahead.path}${ahead.search}${location.hash}`)
}

function change(search: string): void {
  ahead = { path: location.pathname, search }
  clearTimeout(timer)
  timer = setTimeout(settle, settleMs)
  for (const listener of listeners) listener()
}

function subscribe(listener: () => void): () => void {
  const moved = () => {
    clearTimeout(timer)
    timer = undefined
    ahead = null
    listener()
  }
  listeners.add(listener)
  window.addEventListener('popstate', moved)
  window.addEventListener('pagehide', settle)
  // A tap on a link leaves before the moment is over: the address that Back returns to must be whole.
  document.addEventListener('click', settle, true)
  return () => {
    listeners.delete(listener)
    settle()
    if (listeners.size === 0) ahead = null
    window.removeEventListener('popstate', moved)
    window.removeEventListener('pagehide', settle)
    document.removeEventListener('click', settle, true)
  }
}

/**
 * Inputs that live in the address bar, as typed: a link or Back brings them back. A page rendered ahead of its reader
 * shows the example, and takes the address's numbers before the first paint that follows.
 */
export function useAddressInputs(fields: Fields, example: RawInputs): [RawInputs, (change: RawInputs) => void] {
  const search = useSyncExternalStore(subscribe, searchNow, () => '')
  const raw = useMemo(() => readAddress(fields, search, example), [fields, search, example])
  const set = useCallback(
    (changed: RawInputs) => {
      const search = searchNow()
      change(withOthers(fields, search, writeAddress(fields, { ...readAddress(fields, search, example), ...changed })))
    },
    [fields, example],
  )
  return [raw, set]
}
