import type { Block, Picture } from '../sheet/sheet'
import type { Density } from './density'
import { whole, type Flow } from './flow'
import { listsOf } from './lists'
import { mainPicture, stripPicture } from './picture'
import { remarksOf } from './remarks'
import type { Setup } from './set-line'
import { tableOf } from './table'

const isMain = (block: Block): block is Block & Picture => block.kind === 'picture' && block.as === 'main'

export const mainPictures = (blocks: readonly Block[]): number => blocks.filter(isMain).length

/** Blocks measured at one density, the main picture as high as is asked. */
export function flowsOf(
  setup: Setup,
  blocks: readonly Block[],
  width: number,
  density: Density,
): (picture: number) => Flow[] {
  const flows = blocks.map((block) => (isMain(block) ? block : flowOf(setup, block, width, density)))
  return (picture) =>
    flows.map((flow) => ('kind' in flow ? whole(mainPicture(setup, flow, width, picture, density)) : flow))
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
