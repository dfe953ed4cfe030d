import { measureParameter, measureQuery, readMeasure, writeMeasure } from './measure-address'
import type { Measure } from './measure'

/** Where the numbers on the sheet came from. */
export type Origin = 'example' | 'own'

export interface Kept {
  measure: Measure
  origin: Origin
  /** What the last great change took away, to be brought back, and what to call it. */
  undo: { measure: Measure; origin: Origin; says: string } | null
}

/** Browsers refuse an address that changes at every keystroke; the sheet follows at once, address and draft a moment later. */
const settleMs = 250
const draftKey = 'longpoint.handrail-draft'

/** A device that keeps nothing holds the measure in the address only. */
function draft(): string | null {
  try {
    return localStorage.getItem(draftKey)
  } catch {
    return null
  }
}
function keepDraft(text: string): void {
  try {
    localStorage.setItem(draftKey, text)
  } catch {
    // Nothing is lost while the page stands: the address has it all.
  }
}

export interface MeasureStore {
  now: () => Kept
  atFirst: () => Kept
  subscribe: (listener: () => void) => () => void
  /** A change as one types. */
  type: (change: (measure: Measure) => Measure) => void
  /** A change that can be taken back as a whole. */
  replace: (measure: Measure, says: string) => void
  undo: () => void
}

/** The one field sheet of a page: address first, then the draft of this device, then the example. */
export function measureStore(example: Measure): MeasureStore {
  const first: Kept = { measure: example, origin: 'example', undo: null }
  const listeners = new Set<() => void>()
  let kept: Kept | null = null
  let timer: ReturnType<typeof setTimeout> | undefined
  let unsettled = false

  function opened(): Kept {
    const found = readMeasure(new URLSearchParams(location.search).get(measureParameter)) ?? readMeasure(draft())
    if (!found) return first
    const origin = writeMeasure(found) === writeMeasure(example) ? 'example' : 'own'
    return { measure: found, origin, undo: null }
  }
  const now = () => (kept ??= opened())
  function settle(): void {
    clearTimeout(timer)
    if (!unsettled || !kept) return
    unsettled = false
    keepDraft(kept.origin === 'example' ? '' : writeMeasure(kept.measure))
    history.replaceState(history.state, '', `${location.pathname}${measureQuery(kept.measure)}${location.hash}`)
  }
  function change(next: Kept): void {
    kept = next
    unsettled = true
    clearTimeout(timer)
    timer = setTimeout(settle, settleMs)
    for (const listener of listeners) listener()
  }
  function moved(): void {
    kept = null
    unsettled = false
    for (const listener of listeners) listener()
  }

  return {
    now,
    atFirst: () => first,
    subscribe(listener) {
      listeners.add(listener)
      window.addEventListener('popstate', moved)
      window.addEventListener('pagehide', settle)
      // A tap on a link leaves before the moment is over: the address that Back returns to must be whole.
      document.addEventListener('click', settle, true)
      return () => {
        listeners.delete(listener)
        window.removeEventListener('popstate', moved)
        window.removeEventListener('pagehide', settle)
        document.removeEventListener('click', settle, true)
        clearTimeout(timer)
        // What was typed on a page that has been left is none of the next one's address, but stays as the draft.
        if (listeners.size > 0) return
        if (kept && unsettled && kept.origin === 'own') keepDraft(writeMeasure(kept.measure))
        kept = null
        unsettled = false
      }
    },
    type: (edit) => change({ ...now(), measure: edit(now().measure), origin: 'own' }),
    replace(measure, says) {
      const { measure: before, origin } = now()
      change({ measure, origin: 'own', undo: { measure: before, origin, says } })
    },
    undo() {
      const { undo } = now()
      if (undo) change({ measure: undo.measure, origin: undo.origin, undo: null })
    },
  }
}
