import type { Preferences } from '@/lib/schemas/account'

/** What stands before anybody chose. */
const usual: Preferences = { units: 'in', tape: 16, sawSquare: 0, dialStep: 0.25, theme: 'system' }

/** What may be kept; anything else found in storage is passed over. */
const choices: { readonly [K in keyof Preferences]: readonly Preferences[K][] } = {
  units: ['in', 'mm'],
  tape: [8, 16, 32, 64],
  sawSquare: [0, 90],
  dialStep: [0.25, 0.5, 1],
  theme: ['system', 'paper', 'sun', 'night'],
}

const key = 'longpoint.preferences'
const listeners = new Set<() => void>()
let kept: Preferences | undefined

/** Preferences out of stored text; a wrong or missing one falls back to the usual. */
export function readPreferences(text: string | null): Preferences {
  const found = parse(text)
  const pick = <K extends keyof Preferences>(name: K): Preferences[K] =>
    choices[name].find((value) => value === found[name]) ?? usual[name]
  return {
    units: pick('units'),
    tape: pick('tape'),
    sawSquare: pick('sawSquare'),
    dialStep: pick('dialStep'),
    theme: pick('theme'),
  }
}

function parse(text: string | null): Record<string, unknown> {
  try {
    const value: unknown = JSON.parse(text ?? '{}')
    return typeof value === 'object' && value !== null ? (value as Record<string, unknown>) : {}
  } catch {
    return {}
  }
}

/** A phone in private mode may refuse storage: then the choice lasts for the visit. */
function storage(): Storage | undefined {
  try {
    return window.localStorage
  } catch {
    return undefined
  }
}

export const preferencesNow = (): Preferences => (kept ??= readPreferences(storage()?.getItem(key) ?? null))
export const preferencesAtFirst = (): Preferences => usual

/** Keeps a change on this device and shows it at once. */
export function keepPreferences(change: Partial<Preferences>): void {
  kept = { ...preferencesNow(), ...change }
  try {
    storage()?.setItem(key, JSON.stringify(kept))
  } catch {
    // Storage is full: the choice lasts for the visit.
  }
  showTheme(kept.theme)
  for (const listener of listeners) listener()
}

export function subscribePreferences(listener: () => void): () => void {
  listeners.add(listener)
  return () => listeners.delete(listener)
}

function showTheme(theme: Preferences['theme']): void {
  if (theme === 'system') delete document.documentElement.dataset.theme
  else document.documentElement.dataset.theme = theme
}
