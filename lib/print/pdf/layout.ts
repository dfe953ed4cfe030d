import type { Block } from '../sheet/sheet'
import { flowsOf, mainPictures, type Flows } from './blocks'
import { densities, type Density } from './density'
import type { Flow } from './flow'
import { paginate, type Page, type Room } from './paginate'
import type { Setup } from './set-line'

/** More than this leaves a picture lost in white. */
const highestPicture = 380
/** Heights of the picture tried where a sheet takes several pages, and how close the rest may be set for them. */
const picturesOnPages = [360, 300, 250, 200]
const densitiesOnPages = 5

interface Laid {
  density: Density
  pages: Page[]
}
interface Measured {
  density: Density
  room: Room
  flows: Flows
  pictures: number
}

/** Lays the blocks on one page, closer and closer until they fit; on several only where the closest does not. */
export function pagesOf(setup: Setup, blocks: readonly Block[], roomAt: (density: Density) => Room): Laid {
  const pictures = mainPictures(blocks)
  const measured: Measured[] = []
  for (const density of densities) {
    const room = roomAt(density)
    const at = { density, room, flows: flowsOf(setup, blocks, room.width, density), pictures }
    const laid = onOnePage(setup, at)
    if (laid) return laid
    measured.push(at)
  }
  return onPages(setup, measured.slice(0, densitiesOnPages))
}

const heightOf = (flows: readonly Flow[], gap: number) => flows.reduce((sum, { height }) => sum + height + gap, -gap)

/** One page, its picture in all the room that the rest leaves. */
function onOnePage(setup: Setup, { density, room, flows, pictures }: Measured): Laid | null {
  const least = pictures > 0 ? density.picture : 0
  const spare = room.first - heightOf(flows.tried(least), density.gap)
  if (spare < 0) return null
  const picture = pictures > 0 ? Math.min(highestPicture, least + spare / pictures) : 0
  return { density, pages: paginate(setup, flows.drawn(picture), density.gap, room) }
}

/** As few pages as can be; with that, the largest picture, then the most comfortable density. */
function onPages(setup: Setup, measured: readonly Measured[]): Laid {
  const tries = picturesOnPages.flatMap((picture) => measured.map((at) => ({ ...at, picture })))
  const counted = tries.map((at) => ({
    ...at,
    count: paginate(setup, at.flows.tried(at.picture), at.density.gap, at.room).length,
  }))
  const fewest = Math.min(...counted.map(({ count }) => count))
  const best = counted.find(({ count }) => count === fewest)
  if (!best) throw new RangeError('A sheet is tried at one density at least')
  return { density: best.density, pages: paginate(setup, best.flows.drawn(best.picture), best.density.gap, best.room) }
}
