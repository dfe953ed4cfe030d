import type { Viewport } from '@/lib/drawing/compose'

/** A full plate, a low strip, or as high as what is drawn. */
export type PlateShape = 'plate' | 'strip' | 'trim'

/** Widths a plate is composed for, px: a few, so that dragging a window does not compose at every pixel. */
const widthSteps = [300, 340, 400, 480, 560, 640, 760, 860, 960, 1120]

/** Server pages are drawn for a desk; the browser measures and corrects at once. */
export const deskWidth = 760
export const compactBelow = 480

/** Widest step that a frame of this width holds. */
export function stepFor(width: number): number {
  return widthSteps.findLast((step) => step <= width) ?? widthSteps[0] ?? deskWidth
}

/** Paper for a width: text a little smaller and the plate squarer on a phone than on a desk. */
export function viewportFor(width: number, shape: PlateShape): Viewport {
  const fromPhone = (width - 340) / (deskWidth - 340)
  const height = shape === 'strip' ? width * 0.5 : width * (0.91 - 0.13 * fromPhone)
  return {
    width,
    height: Math.round(height),
    textScale: Math.min(1.1, 0.76 + 0.24 * fromPhone),
    margin: width < compactBelow ? 12 : 22,
    trim: shape === 'trim',
  }
}
