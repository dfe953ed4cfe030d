import { compose } from '@/lib/drawing/compose'
import type { Plate } from '@/lib/drawing/plate'
import type { Sketch } from '@/lib/drawing/sketch'
import type { Picture } from '../sheet/sheet'
import { headStyle, type Density } from './density'
import { drawPlate } from './draw-plate'
import { blank, stack } from './flow'
import { setLine, type Part, type Setup } from './set-line'

interface Room {
  width: number
  height: number
}

/** A px of a drawing on paper. */
const pointsPerPx = 0.75
const captionGap = 2
/** What a strip asks for before it is cut to what is drawn. */
const stripHeight = 120

/** The main picture, at most so high: what is drawn may need less. */
export function mainPicture(setup: Setup, picture: Picture, room: Room, density: Density): Part {
  const caption = captionOf(setup, picture, room.width, density)
  return stack([caption, plateIn(setup, picture.sketch, { ...room, height: room.height - caption.height })])
}

/** A picture as high as what is drawn on it. */
export function stripPicture(setup: Setup, picture: Picture, width: number, density: Density): Part {
  const plate = stripOf(picture.sketch, width)
  const height = (plate.height * width) / plate.width
  return stack([captionOf(setup, picture, width, density), drawn(setup, plate, { width, height })])
}

function plateIn(setup: Setup, sketch: Sketch, room: Room): Part {
  // Low pictures take smaller words, so that the rail itself keeps its size.
  const textScale = Math.min(0.8, Math.max(0.6, 0.5 + room.height / 700))
  return drawn(setup, composed(sketch, room, textScale), room)
}

const composed = (sketch: Sketch, { width, height }: Room, textScale: number): Plate =>
  compose(sketch, {
    ...{ width: width / pointsPerPx, height: height / pointsPerPx, textScale },
    ...{ lineScale: 0.75, margin: 8, trim: true },
  })

const strips = new WeakMap<Sketch, Map<number, Plate>>()

/** Strips look alike at every density: they are composed once. */
function stripOf(sketch: Sketch, width: number): Plate {
  const kept = strips.get(sketch)?.get(width)
  if (kept) return kept
  const plate = composed(sketch, { width, height: stripHeight }, 0.8)
  strips.set(sketch, (strips.get(sketch) ?? new Map<number, Plate>()).set(width, plate))
  return plate
}

/** A plate that grew past its paper is drawn smaller; never larger than it was composed. */
function drawn({ doc }: Setup, plate: Plate, room: Room): Part {
  const share = Math.min(pointsPerPx, room.width / plate.width, room.height / plate.height)
  return {
    height: plate.height * share,
    draw: (x, y) => drawPlate(doc, plate, { x: x + (room.width - plate.width * share) / 2, y, pointsPerPx: share }),
  }
}

function captionOf(setup: Setup, { says }: Picture, width: number, { heading }: Density): Part {
  return says ? stack([setLine(setup, [says], headStyle(heading), { width }), blank(captionGap)]) : blank(0)
}
