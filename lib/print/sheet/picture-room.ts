import { compose, type Viewport } from '@/lib/drawing/compose'
import type { Block, Line, List, Sheet } from './sheet'

const onPaper = { width: 720, textScale: 0.8, lineScale: 0.75, margin: 8 }

/** Paper for a strip of bars, px: as high as what is drawn. */
export const stripViewport: Viewport = { ...onPaper, height: 160, trim: true }
/** Paper for the main picture, px. */
export const pictureViewport = (height: number): Viewport => ({ ...onPaper, height })

// Heights on paper at 96 px an inch, as the sheet's style sets them.
const page = 994
const headAndFoot = 290
const tableHead = 64
const tableRow = 40
const listHead = 34
const symbol = 26
const lineOfText = 19
const listRow = 7
const caption = 40
const remark = 26
const bar = 56
/** About so many characters stand in one line of a list. */
const listLine = 44
const keyLine = 112

const charactersOf = (line: Line) =>
  line.reduce(
    (sum, piece) => sum + (typeof piece === 'string' ? piece.length : 'strong' in piece ? piece.strong.length : 8),
    0,
  )
const linesOf = (line: Line, most: number) => Math.max(1, Math.ceil(charactersOf(line) / most))

function heightOf(block: Block): number {
  switch (block.kind) {
    case 'picture':
      return block.as === 'strip' ? caption + compose(block.sketch, stripViewport).height : 0
    case 'table':
      return tableHead + tableRow * block.rows.length + lineOfText * (linesOf(block.key ?? [], keyLine) - 1)
    case 'lists':
      return Math.max(...block.lists.map(listHeight))
    case 'remarks':
      return remark * block.lines.length + 16
  }
}

const listHeight = ({ rows, symbol: has }: List) =>
  rows.reduce(
    (sum, { line, under = [] }) =>
      sum + listRow + lineOfText * (linesOf(line, listLine) + (under.length > 0 ? linesOf(under, listLine) : 0)),
    listHead + (has ? symbol : 0),
  )

/** Height left to the main picture when all the rest stands on one page, px; long tables take it down to a least. */
export function pictureRoom({ blocks, particulars, supersededBy }: Sheet): number {
  const head = headAndFoot + lineOfText * Math.max(0, particulars.length - 4) + (supersededBy ? bar : 0)
  const rest = blocks.reduce((sum, block) => sum + heightOf(block), head)
  return Math.min(420, Math.max(150, page - rest))
}
