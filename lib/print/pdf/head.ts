import type { Line, Sheet } from '../sheet/sheet'
import { headStyle } from './density'
import { capShare } from './faces'
import { fitted } from './fit'
import { setLine, type Part, type Setup } from './set-line'
import { widthOf, write } from './write'

const inch = 72
const apart = 16
const rule = 2.2
const titleTries = [
  [26, 1],
  [23, 1],
  [20, 2],
  [17, 2],
  [15, 2],
] as const
const underTries = [
  [13.2, 2],
  [12, 2],
  [10.6, 3],
  [9.4, 4],
] as const

/** Head of the first page: what it is, when and by whom it was measured, and the hand in an inch-high letter. */
export function headOf(setup: Setup, sheet: Sheet, width: number, page: string): Part {
  const hand = sheet.hand ? handOf(setup, sheet.hand) : null
  const room = width - (hand ? hand.width + apart : 0)
  const particulars = particularsOf(
    setup,
    page ? [[{ strong: page }], ...sheet.particulars] : sheet.particulars,
    room * 0.38,
  )
  const beside = room - (particulars.width > 0 ? particulars.width + apart : 0)
  const title = fitted(setup, sheet.title, beside, titleTries)
  const under = fitted(setup, sheet.under, beside, underTries)
  const height = Math.max(title.height + 2 + under.height, particulars.height, hand?.height ?? 0)
  return {
    height: height + 5 + rule,
    draw: (x, y) => {
      title.draw(x, y - 3)
      under.draw(x, y + title.height - 1)
      particulars.draw(x + room - particulars.width, y)
      hand?.draw(x + width - hand.width, y)
      setup.doc.rect(x, y + height + 5, width, rule).fill('#000')
    },
  }
}

/** Head of every further page. */
export function smallHeadOf(setup: Setup, sheet: Sheet, width: number, page: string): Part {
  const hand = sheet.hand ? `hand ${sheet.hand} · ` : ''
  const right = setLine(setup, [`${hand}${page}`], headStyle(12), { width: width * 0.3, align: 'right' })
  const name: Line = [sheet.title, `  ·  ${sheet.under}`]
  const left = setLine(setup, name, headStyle(12), { width: width - right.width - apart, most: 2 })
  const height = Math.max(left.height, right.height)
  return {
    height: height + 4 + rule,
    draw: (x, y) => {
      left.draw(x, y)
      right.draw(x + width - width * 0.3, y)
      setup.doc.rect(x, y + height + 4, width, rule).fill('#000')
    },
  }
}

/** Lines of who, when and with what, to the right; many of them are set smaller. */
function particularsOf(setup: Setup, lines: readonly Line[], width: number): Part & { width: number } {
  const size = lines.length > 12 ? 6.6 : lines.length > 8 ? 7.6 : 9.4
  const style = { plain: { face: 'text', size }, strong: { face: 'bold', size }, number: size } as const
  const most = Math.max(0, ...lines.map((line) => setLine(setup, line, style, { width }).width))
  const set = lines.map((line) => setLine(setup, line, style, { width: most, align: 'right', most: 3 }))
  return {
    width: most,
    height: set.reduce((sum, line) => sum + line.height + 1, 0),
    draw: (x, y) => {
      let at = y
      for (const line of set) {
        line.draw(x, at)
        at += line.height + 1
      }
    },
  }
}

/** The hand in capitals an inch high, and which way it is read. */
function handOf({ doc }: Setup, hand: 'L' | 'R'): Part & { width: number } {
  const size = inch / capShare(doc, 'word')
  const says = 'hand, going UP'
  const saysWidth = widthOf(doc, 'word', 10.5, says)
  const width = saysWidth + 13
  return {
    width,
    height: inch + 16,
    draw: (x, y) => {
      write(doc, hand, { face: 'word', size, x: x + (width - widthOf(doc, 'word', size, hand)) / 2, y: y + inch })
      write(doc, says, { face: 'word', size: 10.5, x, y: y + inch + 14 })
      upArrow(doc, x + saysWidth + 8.5, y + inch + 4.5)
    },
  }
}

/** An arrow up, its point at x, y. */
function upArrow(doc: Setup['doc'], x: number, y: number): void {
  const [wide, head, shaft, long] = [4.2, 6, 1, 10.5]
  doc
    .polygon(
      [x, y],
      [x + wide, y + head],
      [x + shaft, y + head],
      [x + shaft, y + long],
      [x - shaft, y + long],
      [x - shaft, y + head],
      [x - wide, y + head],
    )
    .fill('#000')
}
