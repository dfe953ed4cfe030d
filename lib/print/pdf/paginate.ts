import { blank, type Flow } from './flow'
import type { Part, Setup } from './set-line'

/** Between head and foot of the first page, and of every further one. */
export interface Room {
  first: number
  further: number
  width: number
}
/** What stands on a page, from its upper edge down. */
export type Page = { part: Part; top: number }[]

/** What sums of many heights may be off. */
const hair = 0.01

/** Puts flows on pages in their order, each as far as its page has room. */
export function paginate(setup: Setup, flows: readonly Flow[], gap: number, { first, further }: Room): Page[] {
  const pages: Page[] = [[]]
  let top = 0
  const queue = [...flows]
  for (let flow = queue.shift(); flow; flow = queue.shift()) {
    const page = pages.at(-1) ?? []
    const room = (pages.length === 1 ? first : further) - top + hair
    const isFresh = page.length === 0 && pages.length > 1
    const taken = flow.take(room, isFresh) ?? (isFresh ? { part: shrunk(setup, flow, room), rest: null } : null)
    if (taken) {
      page.push({ part: taken.part, top })
      top += taken.part.height + gap
    }
    const rest = taken ? taken.rest : flow
    if (!rest) continue
    queue.unshift(rest)
    pages.push([])
    top = 0
  }
  return pages
}

/** What no page holds is drawn smaller rather than cut off. */
function shrunk({ doc }: Setup, flow: Flow, room: number): Part {
  const part = flow.take(Infinity)?.part ?? blank(0)
  const share = Math.min(1, room / part.height)
  return {
    height: part.height * share,
    draw: (x, y) => {
      doc.save()
      doc.translate(x, y).scale(share)
      part.draw(0, 0)
      doc.restore()
    },
  }
}
