import { shapeOutline } from '@/lib/drawing/shapes'
import type { PlacedRun } from '@/lib/drawing/plate'
import { stretchesOf, tidy, type Face, type Pdf } from './faces'

type Shape = Extract<PlacedRun, { kind: 'shape' }>['shape']

/** A piece of a line at its place in it: x from its left end, y from its baseline, down. */
export type Run = { x: number; y: number; size: number; width: number } & (
  { kind: 'text'; face: Face; text: string } | { kind: 'shape'; shape: Shape } | { kind: 'rule' }
)

/** Width of a text as it will be written, points. */
export function widthOf(doc: Pdf, face: Face, size: number, text: string): number {
  return stretchesOf(doc, face, tidy(text)).reduce(
    (sum, stretch) => sum + doc.font(stretch.file).fontSize(size).widthOfString(stretch.text),
    0,
  )
}

export interface Written {
  face: Face
  size: number
  x: number
  /** The baseline. */
  y: number
  colour?: string
}

/** Writes a text on its baseline, from its left end. */
export function write(doc: Pdf, text: string, { face, size, x, y, colour = '#000' }: Written): void {
  let at = x
  for (const { file, text: letters } of stretchesOf(doc, face, tidy(text))) {
    doc.font(file).fontSize(size).fillColor(colour)
    doc.text(letters, at, y, { lineBreak: false, baseline: 'alphabetic' })
    at += doc.widthOfString(letters)
  }
}

/** Draws one run of a line, its own place already counted in. */
export function writeRun(doc: Pdf, run: Run, colour = '#000'): void {
  const { x, y, size, width } = run
  if (run.kind === 'text') write(doc, run.text, { face: run.face, size, x, y, colour })
  else if (run.kind === 'shape') {
    const outline = shapeOutline({ ...run, ink: 'text' }).map((spot): [number, number] => [spot.x, spot.y])
    doc.polygon(...outline).fill(colour)
  } else doc.rect(x, y + size * 0.08, width, Math.max(0.6, size * 0.07)).fill(colour)
}
