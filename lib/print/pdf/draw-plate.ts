import { inkDashes } from '@/lib/drawing/inks'
import type { Mark, PlacedLabel, Plate } from '@/lib/drawing/plate'
import type { Fill, Ink } from '@/lib/drawing/sketch'
import type { Pdf } from './faces'
import { writeRun } from './write'

/** Black on white: what is cut and what is wrong stay black, what only explains is grey. */
const lineColours: Readonly<Record<Ink, string>> = {
  object: '#000',
  cut: '#000',
  off: '#000',
  flag: '#000',
  tape: '#000',
  dim: '#333',
  centre: '#444',
  ext: '#777',
  hatch: '#999',
  ghost: '#888',
  post: '#777',
}
const fillColours: Readonly<Record<Fill, string | null>> = {
  face: '#eeeeee',
  solid: '#000',
  'off-face': '#dddddd',
  tape: '#f4f4f4',
  shade: '#d8d8d8',
  ground: '#fff',
}

/** Draws a composed plate with its upper left corner at x, y; `pointsPerPx` sizes it (0.75 is its own size on paper). */
export function drawPlate(doc: Pdf, plate: Plate, at: { x: number; y: number; pointsPerPx: number }): void {
  doc.save()
  doc.translate(at.x, at.y).scale(at.pointsPerPx)
  for (const mark of plate.marks) drawMark(doc, mark)
  for (const label of plate.labels) drawLabel(doc, label)
  doc.restore()
}

function drawMark(doc: Pdf, { points, closed, ink, fill, width }: Mark): void {
  const [first, ...rest] = points
  if (!first) return
  doc.lineWidth(width).lineJoin('round').undash()
  const dash = inkDashes[ink]
  if (dash) doc.dash(dash[0] ?? 4, { space: dash[1] ?? 4 })
  doc.moveTo(first.x, first.y)
  for (const point of rest) doc.lineTo(point.x, point.y)
  if (closed) doc.closePath()
  const inside = fill && fillColours[fill]
  if (inside) doc.fillAndStroke(inside, lineColours[ink])
  else doc.stroke(lineColours[ink])
}

function drawLabel(doc: Pdf, label: PlacedLabel): void {
  const isDisc = label.badge === 'disc'
  if (isDisc) doc.circle(label.box.x, label.box.y, label.box.halfWidth).fill('#000')
  doc.save()
  doc.translate(label.x, label.y).rotate(label.turn)
  doc.markContent('Span', { actual: saidBy(label.runs) })
  for (const run of label.runs) writeRun(doc, run, isDisc ? '#fff' : run.ink === 'quiet' ? '#333' : '#000')
  doc.endMarkedContent()
  doc.restore()
}

/** A label in plain characters: a fraction stands off its whole number, and a row off the one over it. */
function saidBy(runs: PlacedLabel['runs']): string {
  return runs.reduce((said, run, i) => {
    if (run.kind === 'shape') return said
    const before = runs[i - 1]
    const isApart = before !== undefined && (run.x < before.x || (run.size < before.size && /^\d/.test(run.text)))
    return said + (isApart && /[^\s/]$/.test(said) ? ' ' : '') + run.text.replace('⁄', '/')
  }, '')
}
