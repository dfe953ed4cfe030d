import { compose } from '@/lib/drawing/compose'
import type { Plate } from '@/lib/drawing/plate'
import type { Picture } from '../sheet/sheet'
import { headStyle, type Density } from './density'
import { drawPlate } from './draw-plate'
import { setLine, type Part, type Setup } from './set-line'

/** A px of a drawing on paper. */
const pointsPerPx = 0.75
const lines = { lineScale: 0.75, margin: 8 }
const captionGap = 2

/** The main picture in the room that is left to it: composed when it is drawn, once. */
export function mainPicture(setup: Setup, picture: Picture, width: number, height: number, density: Density): Part {
  const caption = captionOf(setup, picture, width, density)
  return {
    height,
    draw: (x, y) => {
      caption.draw(x, y)
      const room = height - caption.height
      drawFitted(setup, composed(picture, width, room), { x, y: y + caption.height, width, height: room })
    },
  }
}

/** A picture as high as what is drawn on it. */
export function stripPicture(setup: Setup, picture: Picture, width: number, density: Density): Part {
  const caption = captionOf(setup, picture, width, density)
  const plate = compose(picture.sketch, {
    ...lines,
    width: width / pointsPerPx,
    height: 160,
    textScale: 0.8,
    trim: true,
  })
  const share = Math.min(pointsPerPx, width / plate.width)
  return {
    height: caption.height + plate.height * share,
    draw: (x, y) => {
      caption.draw(x, y)
      drawPlate(setup.doc, plate, {
        x: x + (width - plate.width * share) / 2,
        y: y + caption.height,
        pointsPerPx: share,
      })
    },
  }
}

/** Low pictures take smaller words, so that the rail itself keeps its size. */
function composed({ sketch }: Picture, width: number, height: number): Plate {
  const textScale = Math.min(0.8, Math.max(0.6, 0.5 + height / 700))
  return compose(sketch, { ...lines, width: width / pointsPerPx, height: height / pointsPerPx, textScale })
}

function captionOf(setup: Setup, { says }: Picture, width: number, { heading }: Density): Part {
  if (!says) return { height: 0, draw: () => {} }
  const set = setLine(setup, [says], headStyle(heading), { width })
  return { height: set.height + captionGap, draw: set.draw }
}

/** A drawing that grew past its paper is drawn smaller; never larger than it was composed. */
function drawFitted({ doc }: Setup, plate: Plate, at: { x: number; y: number; width: number; height: number }): void {
  const share = Math.min(pointsPerPx, at.width / plate.width, at.height / plate.height)
  drawPlate(doc, plate, {
    x: at.x + (at.width - plate.width * share) / 2,
    y: at.y + (at.height - plate.height * share) / 2,
    pointsPerPx: share,
  })
}
