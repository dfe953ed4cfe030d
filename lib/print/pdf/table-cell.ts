import type { Cell, Line, SheetReading } from '../sheet/sheet'
import type { Density } from './density'
import type { Pdf } from './faces'
import { setLine, type Setting, type Setup } from './set-line'
import { bothUnits, type Style } from './words'

export interface CellStyle {
  line: Style
  under: Style
}
interface SetCell {
  lines: readonly Setting[]
  /** Side of the box to tick. */
  box: number
  height: number
}
interface Measure {
  width: number
  style: CellStyle
  density: Density
}

/** Measures what stands in one cell of a table. */
export function setCell(setup: Setup, cell: Cell, { width, style, density }: Measure): SetCell {
  const { line, under } = cell
  const set = (words: Line | undefined, face: Style) =>
    words && words.length > 0 ? [setLine(setup, words, face, { width, align: 'centre' })] : []
  const lines = [...set(line, style.line), ...set(under, style.under)]
  const box = cell.box ? Math.min(density.number, width) : 0
  return {
    lines,
    box,
    height: Math.max(
      box,
      lines.reduce((sum, { height }) => sum + height, 0),
    ),
  }
}

/** A cell as its reader reads it: in millimetres the tape goes under the number, where it has room. */
export function inUnits({ line, under, ...box }: Cell, reading: SheetReading): Cell {
  const tapes = line.flatMap((piece) => (typeof piece === 'object' && 'tape' in piece ? [piece.tape] : []))
  if (reading.preferences.units === 'in' || tapes.length === 0) return { line, ...(under ? { under } : {}), ...box }
  const both = tapes.map((tape) => bothUnits(tape, reading))
  let at = 0
  return {
    line: line.map((piece) =>
      typeof piece === 'object' && 'tape' in piece ? { strong: both[at++]?.metric ?? '' } : piece,
    ),
    under: [both.map(({ tape }) => tape).join(' · '), ...(under ? [' · ', ...under] : [])],
  }
}

/** Draws a measured cell in the middle of its place. */
export function drawCell(
  doc: Pdf,
  { lines, box, height }: SetCell,
  at: { x: number; y: number; width: number; height: number },
): void {
  if (box > 0)
    doc
      .rect(at.x + (at.width - box) / 2, at.y + (at.height - box) / 2, box, box)
      .undash()
      .lineWidth(1.1)
      .stroke('#000')
  let y = at.y + (at.height - height) / 2
  for (const line of lines) {
    line.draw(at.x, y)
    y += line.height
  }
}
