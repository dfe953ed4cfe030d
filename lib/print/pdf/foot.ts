import { qrModules, type QrModules } from '../sheet/qr'
import type { Sheet } from '../sheet/sheet'
import { stack } from './flow'
import { setLine, type Part, type Setup } from './set-line'
import { widthOf, write } from './write'

const inch = 72
const apart = 14
const ruleGap = 10
/** Words beside the ruler no higher than this; more of them go over it, across the sheet. */
const tallest = 104

/** Foot of the first page: where the sheet is found again, what to mind, and the ruler that proves the printer. */
export function footOf(setup: Setup, sheet: Sheet, width: number): Part {
  const code = qrModules(sheet.address)
  const side = code ? Math.min(96, Math.max(inch, code.size * 1.2)) : 0
  const beside = width - side - apart * (code ? 2 : 1) - 3 * inch
  const narrow = cautionsOf(setup, sheet, beside, 8.4)
  const isWide = narrow.height > tallest
  const cautions = isWide ? cautionsOf(setup, sheet, width, 7.6) : narrow
  const row = Math.max(side, 34, isWide ? 0 : cautions.height)
  const above = isWide ? cautions.height + 6 : 0
  const height = ruleGap + above + row
  return {
    height,
    draw: (x, y) => {
      const bottom = y + height
      if (code) drawCode(setup.doc, code, x, bottom - side, side)
      setup.doc.rect(x, y, width, 0.8).fill('#000')
      if (isWide) cautions.draw(x, y + ruleGap)
      else cautions.draw(x + (code ? side + apart : 0), bottom - cautions.height)
      drawRuler(setup.doc, x + width - 3 * inch, bottom - 12)
    },
  }
}

function cautionsOf(setup: Setup, { cautions }: Sheet, width: number, size: number): Part {
  const style = { plain: { face: 'text', size }, strong: { face: 'bold', size }, number: size } as const
  return stack(
    cautions.map((line) => {
      const set = setLine(setup, line, style, { width })
      return { height: set.height + 1.5, draw: set.draw }
    }),
  )
}

/** The code as one path, a rectangle for each stretch of dark modules in a row. */
function drawCode(doc: Setup['doc'], { size, dark }: QrModules, x: number, y: number, side: number): void {
  const dot = side / size
  // Four modules of white round it, as readers ask for, whatever lies under the sheet.
  doc.rect(x - 4 * dot, y - 4 * dot, side + 8 * dot, side + 8 * dot).fill('#fff')
  for (let row = 0; row < size; row++) {
    for (let from = 0; from < size; from++) {
      if (!dark[row * size + from]) continue
      let to = from
      while (to < size && dark[row * size + to]) to++
      doc.rect(x + from * dot, y + row * dot, (to - from) * dot, dot)
      from = to
    }
  }
  doc.fill('#000')
}

/** Three inches exactly, a tick each inch; x, y is its left end. */
function drawRuler(doc: Setup['doc'], x: number, y: number): void {
  const size = 9.4
  const says = 'print check: 3 in exactly'
  write(doc, says, { face: 'word', size, x: x + (3 * inch - widthOf(doc, 'word', size, says)) / 2, y: y - 9 })
  doc.lineWidth(0.8).undash().lineCap('butt')
  doc.moveTo(x, y).lineTo(x + 3 * inch, y)
  for (const at of [0, 1, 2, 3]) {
    const half = at % 3 === 0 ? 8 : 5
    doc.moveTo(x + at * inch, y - half).lineTo(x + at * inch, y + half)
  }
  doc.stroke('#000')
}
