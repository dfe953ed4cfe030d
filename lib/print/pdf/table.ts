import type { Cell, Column, Line, Table } from '../sheet/sheet'
import { headStyle, numberStyle, smallStyle, textStyle, type Density } from './density'
import { rowsFlow, type Flow } from './flow'
import { drawCell, inUnits, setCell, type CellStyle } from './table-cell'
import { lineWidth, setLine, type Part, type Setting, type Setup } from './set-line'

const pad = 3
const thin = 0.8

interface Placed extends Column {
  left: number
  width: number
  style: CellStyle
}

/** A table: heads on grey, a row a part, its key under it. Where a page ends, the heads come again. */
export function tableOf(setup: Setup, table: Table, width: number, density: Density): Flow {
  const read = table.rows.map((cells) => cells.map((cell) => inUnits(cell, setup.reading)))
  const columns = placed(setup, { ...table, rows: read }, width, density)
  const rows = read.map((cells) => rowOf(setup, columns, cells, density))
  const key = table.key && keyOf(setup, table.key, width, density)
  return rowsFlow({ top: headRow(setup, columns, density), rows, ...(key ? { end: key } : {}) })
}

/** Columns in their places; the numbers of a table keep one size, the largest at which every one fits its column. */
function placed(setup: Setup, { columns, rows }: Table, width: number, density: Density): Placed[] {
  const shares = columns.reduce((sum, { share }) => sum + share, 0)
  const widths = columns.map(({ share }) => (share / shares) * width)
  const needs = (style: CellStyle, as: Column['as'], which: 'line' | 'under') =>
    Math.max(
      1,
      ...columns.flatMap((column, i) =>
        column.as !== as
          ? []
          : rows.map((cells) => lineWidth(setup, cells[i]?.[which] ?? [], style[which]) / ((widths[i] ?? 1) - 2 * pad)),
      ),
    )
  const styles = (['mark', 'number', 'words'] as const).map((as) => {
    const usual = styleOf(as, density, 1, 1)
    // Numbers wrap sooner than they get too small for a hand on a saw.
    return [
      as,
      styleOf(as, density, 1 / Math.min(needs(usual, as, 'line'), 1.35), 1 / Math.min(needs(usual, as, 'under'), 1.2)),
    ] as const
  })
  const byKind = new Map(styles)
  let left = 0
  return columns.map((column, i) => {
    const at = left
    left += widths[i] ?? 0
    return {
      ...column,
      left: at,
      width: widths[i] ?? 0,
      style: byKind.get(column.as) ?? styleOf('words', density, 1, 1),
    }
  })
}

function styleOf(as: Column['as'], density: Density, line: number, under: number): CellStyle {
  const small = smallStyle({ ...density, small: density.small * under })
  if (as === 'mark') return { line: headStyle(density.mark * line), under: headStyle(density.small * 1.12 * under) }
  if (as === 'number') return { line: numberStyle(density.number * line), under: small }
  const size = density.text * 0.94
  const plain = textStyle({ ...density, text: size })
  return { line: { ...plain, strong: { face: 'word', size: size * 1.1 } }, under: small }
}

function rowOf(setup: Setup, columns: readonly Placed[], cells: readonly Cell[], density: Density): Part {
  const set = columns.map(({ width, style }, i) =>
    setCell(setup, cells[i] ?? { line: [] }, { width: width - 2 * pad, style, density }),
  )
  const height = Math.max(...set.map((cell) => cell.height)) + 2 * density.cellPad
  return {
    height,
    draw: (x, y) =>
      columns.forEach(({ left, width }, i) => {
        const cell = set[i]
        setup.doc
          .rect(x + left, y, width, height)
          .undash()
          .lineWidth(thin)
          .stroke('#000')
        if (cell) drawCell(setup.doc, cell, { x: x + left + pad, y, width: width - 2 * pad, height })
      }),
  }
}

function headRow(setup: Setup, columns: readonly Placed[], { tableHead, cellPad }: Density): Part {
  const set = columns.map((column) => headLines(setup, column, tableHead))
  const height = Math.max(...set.map(heightOf)) + 2 * Math.min(cellPad, 3)
  return {
    height,
    draw: (x, y) =>
      columns.forEach(({ left, width }, i) => {
        const lines = set[i] ?? []
        setup.doc
          .rect(x + left, y, width, height)
          .undash()
          .lineWidth(thin)
          .fillAndStroke('#ececec', '#000')
        let at = y + (height - heightOf(lines)) / 2
        for (const line of lines) {
          line.draw(x + left + 1.5, at)
          at += line.height
        }
      }),
  }
}

const heightOf = (lines: readonly Setting[]) => lines.reduce((sum, { height }) => sum + height, 0)

function headLines(setup: Setup, { head, under, width }: Placed, size: number): Setting[] {
  const room = width - 3
  return [head, ...(under ? [under] : [])].map((text) => {
    const needed = lineWidth(setup, [text], headStyle(size))
    return setLine(setup, [text], headStyle(size * Math.min(1, Math.max(0.8, room / needed))), {
      width: room,
      align: 'centre',
    })
  })
}

function keyOf(setup: Setup, key: Line, width: number, density: Density): Part {
  const size = Math.max(density.text * 0.88, 7)
  const set = setLine(setup, key, textStyle({ ...density, text: size }), { width })
  return { height: set.height + 3, draw: (x, y) => set.draw(x, y + 3) }
}
