import { measureParameter, measureQuery, readMeasure } from './measure-address'
import { isBlank, keepDraft, readDrafts, sameMeasure, type Drafts } from './measure-drafts'
import type { Measure } from './measure'

/** Where the numbers on the sheet came from. */
export type Origin = 'example' | 'own'

/** A sheet as it stands. */
interface Standing {
  measure: Measure
  origin: Origin
  /** Counts sheets begun anew: numbers of the one before have no place on the next. */
  sheet: number
  /** Another measure of this reader, which this one took the place of. */
  earlier: Measure | null
}

export interface Kept extends Standing {
  /** The sheet before the last great change, to be brought back; the one that came of it; and what to call it. */
  undo: { before: Standing; after: Measure; says: string } | null
}

/** Browsers refuse an address that changes at every keystroke; the sheet follows at once, address and draft a moment later. */
const settleMs = 250

export interface MeasureStore {
  /** True for a sheet that is kept in a job, and not on this device. */
  readonly saved: boolean
  now: () => Kept
  atFirst: () => Kept
  subscribe: (listener: () => void) => () => void
  /** A change as one types. */
  type: (change: (measure: Measure) => Measure) => void
  /** A change that can be taken back as a whole. */
  replace: (measure: Measure, says: string) => void
  /** An empty sheet, or another one as a whole; can be taken back too, and what stood there is kept as the earlier one. */
  begin: (measure: Measure, says: string) => void
  /** The example in place of the sheet. */
  showExample: () => void
  /** Takes the last great change back, and can itself be taken back. */
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
  const first: Kept = { measure: start, origin: saved ? 'own' : 'example', undo: null, earlier: null, sheet: 0 }
  const listeners = new Set<() => void>()
  let kept: Kept | null = null
  let timer: ReturnType<typeof setTimeout> | undefined
  let unsettled = false

  function opened(): Kept {
    const drafts: Drafts = saved ? { now: null, before: null } : readDrafts()
    const found = readMeasure(new URLSearchParams(location.search).get(measureParameter)) ?? drafts.now
    const measure = found ?? start
    const worth = (one: Measure | null) => one !== null && !isBlank(one) && !sameMeasure(one, measure)
    const earlier = [drafts.now, drafts.before].find(worth) ?? null
    if (!found) return { ...first, earlier }
    const origin = !saved && sameMeasure(found, start) ? 'example' : 'own'
    // The page was made ahead with the example: its rail is none of this sheet's.
    return { measure: found, origin, undo: null, earlier, sheet: origin === 'own' ? 1 : 0 }
  }
  const now = () => (kept ??= opened())
  function keep({ origin, measure, earlier }: Kept): void {
    if (saved) return
    const draft = readDrafts().now
    if (origin === 'own') keepDraft('now', measure)
    // Back from a cleared sheet to the example: the empty one is not worth keeping.
    else if (draft && isBlank(draft)) keepDraft('now', null)
    if (earlier) keepDraft('before', earlier)
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
  const standing = (): Standing => {
    const { measure, origin, sheet, earlier } = now()
    return { measure, origin, sheet, earlier }
  }
  function changeGreatly(next: Standing, says: string): void {
    change({ ...next, undo: { before: standing(), after: next.measure, says } })
  }
  function begin(measure: Measure, origin: Origin, says: string): void {
    const { measure: left, origin: leftOrigin, sheet, earlier } = now()
    const own = leftOrigin === 'own' && !isBlank(left) ? left : earlier
    changeGreatly({ measure, origin, sheet: sheet + 1, earlier: own && !sameMeasure(own, measure) ? own : null }, says)
  }
  function moved(): void {
    kept = null
    unsettled = false
    for (const listener of listeners) listener()
  }

  return {
    saved,
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
    replace: (measure, says) => changeGreatly({ ...standing(), measure, origin: 'own' }, says),
    begin: (measure, says) => begin(measure, 'own', says),
    showExample: () => begin(start, 'example', 'The example stands on the sheet.'),
    undo() {
      const { undo } = now()
      if (undo) changeGreatly(undo.before, 'Brought back as it was.')
    },
  }
}
