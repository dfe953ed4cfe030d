import { measureParameter, measureQuery, readMeasure, writeMeasure } from './measure-address'
import type { Measure } from './measure'

/** Where the numbers on the sheet came from. */
export type Origin = 'example' | 'own'

export interface Kept {
  measure: Measure
  origin: Origin
  /** What the last great change took away, to be brought back, and what to call it. */
  undo: { measure: Measure; origin: Origin; sheet: number; says: string } | null
  /** Counts sheets begun anew: numbers of the one before have no place on the next. */
  sheet: number
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
  /** An empty sheet, or another one as a whole; can be taken back too. */
  begin: (measure: Measure, says: string) => void
  undo: () => void
}

/** Other things that the address says, such as the saved sheet that is being revised, stay. */
function addressOf(measure: Measure): string {
  const others = new URLSearchParams(location.search)
  others.delete(measureParameter)
  const rest = others.toString()
  return `${location.pathname}${measureQuery(measure)}${rest === '' ? '' : `&${rest}`}${location.hash}`
}

/**
 * The one field sheet of a page: address first, then the draft of this device, then the example.
 * A sheet that was `saved` starts from what was kept, and leaves the draft alone.
 */
export function measureStore(start: Measure, saved = false): MeasureStore {
  const first: Kept = { measure: start, origin: saved ? 'own' : 'example', undo: null, sheet: 0 }
  const listeners = new Set<() => void>()
  let kept: Kept | null = null
  let timer: ReturnType<typeof setTimeout> | undefined
  let unsettled = false

  function opened(): Kept {
    const found =
      readMeasure(new URLSearchParams(location.search).get(measureParameter)) ?? (saved ? null : readMeasure(draft()))
    if (!found) return first
    const origin = !saved && writeMeasure(found) === writeMeasure(start) ? 'example' : 'own'
    // The page was made ahead with the example: its rail is none of this sheet's.
    return { measure: found, origin, undo: null, sheet: origin === 'own' ? 1 : 0 }
  }
  const now = () => (kept ??= opened())
  const keep = ({ origin, measure }: Kept) => {
    if (!saved) keepDraft(origin === 'example' ? '' : writeMeasure(measure))
  }
  function settle(): void {
    clearTimeout(timer)
    if (!unsettled || !kept) return
    unsettled = false
    keep(kept)
    history.replaceState(history.state, '', addressOf(kept.measure))
  }
  function change(next: Kept): void {
    kept = next
    unsettled = true
    clearTimeout(timer)
    timer = setTimeout(settle, settleMs)
    for (const listener of listeners) listener()
  }
  const before = (says: string): Kept['undo'] => {
    const { measure, origin, sheet } = now()
    return { measure, origin, sheet, says }
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
        if (kept && unsettled) keep(kept)
        kept = null
        unsettled = false
      }
    },
    type: (edit) => change({ ...now(), measure: edit(now().measure), origin: 'own' }),
    replace: (measure, says) => change({ measure, origin: 'own', undo: before(says), sheet: now().sheet }),
    begin: (measure, says) => change({ measure, origin: 'own', undo: before(says), sheet: now().sheet + 1 }),
    undo() {
      const { undo } = now()
      if (undo) change({ measure: undo.measure, origin: undo.origin, sheet: undo.sheet, undo: null })
    },
  }
}
