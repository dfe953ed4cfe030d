import type { Block, Picture } from '../sheet/sheet'
import type { Density } from './density'
import { blank, whole, type Flow } from './flow'
import { listsOf } from './lists'
import { mainPicture, stripPicture } from './picture'
import { remarksOf } from './remarks'
import type { Part, Setup } from './set-line'
import { tableOf } from './table'

const isMain = (block: Block): block is Block & Picture => block.kind === 'picture' && block.as === 'main'

export const mainPictures = (blocks: readonly Block[]): number => blocks.filter(isMain).length

/** Blocks measured at one density. */
export interface Flows {
  /** With a blank of this height for the main picture: cheap, to try how it fits. */
  tried: (picture: number) => Flow[]
  /** With the main picture drawn, this high at most. */
  drawn: (picture: number) => Flow[]
}

export function flowsOf(setup: Setup, blocks: readonly Block[], width: number, density: Density): Flows {
  const flows = blocks.map((block) => (isMain(block) ? block : flowOf(setup, block, width, density)))
  const filled = (picture: (block: Picture) => Part) =>
    flows.map((flow) => ('kind' in flow ? whole(picture(flow)) : flow))
  return {
    tried: (height) => filled(() => blank(height)),
    drawn: (height) => filled((block) => mainPicture(setup, block, { width, height }, density)),
  }
}

function flowOf(setup: Setup, block: Block, width: number, density: Density): Flow {
  switch (block.kind) {
    case 'picture':
      return whole(stripPicture(setup, block, width, density))
    case 'table':
      return tableOf(setup, block, width, density)
    case 'lists':
      return listsOf(setup, block, width, density)
    case 'remarks':
      return whole(remarksOf(setup, block, width, density))
  }
}
