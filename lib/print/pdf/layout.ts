import type { Block } from '../sheet/sheet'
import { flowsOf, mainPictures } from './blocks'
import { densities, type Density } from './density'
import type { Flow } from './flow'
import type { Part, Setup } from './set-line'

export interface Room {
  /** Between head and foot of the first page, and of every further one. */
  first: number
  further: number
  width: number
}
/** What stands on a page, from its upper edge down. */
export type Page = { part: Part; top: number }[]

/** More than this leaves a picture lost in white. */
const highestPicture = 380
/** On several pages there is room for a picture that can be read. */
const pictureOnPages = 200

/** Lays the blocks on one page, closer and closer until they fit; on several only where the closest does not. */
export function pagesOf(
  setup: Setup,
  blocks: readonly Block[],
  roomAt: (density: Density) => Room,
): { density: Density; pages: Page[] } {
  const pictures = mainPictures(blocks)
  const measured = densities.map((density) => ({
    density,
    room: roomAt(density),
    flows: flowsAt(setup, blocks, roomAt(density), density),
  }))
  for (const { density, room, flows } of measured) {
    const least = pictures > 0 ? density.picture : 0
    const spare = room.first - heightOf(flows(least), density.gap)
    if (spare < 0) continue
    const picture = Math.min(highestPicture, least + (pictures > 0 ? spare / pictures : 0))
    return { density, pages: paginate(flows(picture), density.gap, room) }
  }
  const laid = measured.map(({ density, room, flows }) => ({
    density,
    pages: paginate(flows(pictureOnPages), density.gap, room),
  }))
  const fewest = Math.min(...laid.map(({ pages }) => pages.length))
  const best = laid.find(({ pages }) => pages.length === fewest)
  if (!best) throw new RangeError('A sheet is laid at one density at least')
  return best
}

const flowsAt = (setup: Setup, blocks: readonly Block[], { width }: Room, density: Density) =>
  flowsOf(setup, blocks, width, density)

const heightOf = (flows: readonly Flow[], gap: number) => flows.reduce((sum, { height }) => sum + height + gap, -gap)

/** Puts flows on pages in their order, each as far as its page has room. */
function paginate(flows: readonly Flow[], gap: number, { first, further }: Room): Page[] {
  const pages: Page[] = [[]]
  let top = 0
  for (const flow of flows) {
    let rest: Flow | null = flow
    while (rest) {
      const page = pages.at(-1) ?? []
      const room = (pages.length === 1 ? first : further) - top
      // A hair for sums of many heights. What no page holds is drawn all the same rather than lost.
      const taken: ReturnType<Flow['take']> = rest.take(
        page.length === 0 && pages.length > 1 && rest.take(room) === null ? Infinity : room + 0.01,
      )
      if (!taken) {
        pages.push([])
        top = 0
        continue
      }
      page.push({ part: taken.part, top })
      top += taken.part.height + gap
      rest = taken.rest
    }
  }
  return pages
}
