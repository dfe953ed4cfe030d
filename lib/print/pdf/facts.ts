import { blankRule, type Line } from '../sheet/sheet'
import { scaled, textStyle, type Density } from './density'
import { lineWidth, setLine, type Part, type Setup } from './set-line'
import { blankShare, type Style } from './words'

const padAcross = 8
const sizes = [1, 0.92, 0.84, 0.78]

/** The facts in one boxed row. */
export function factsOf(setup: Setup, facts: readonly Line[], width: number, density: Density): Part {
  const usual = textStyle(density)
  const needed = (share: number) => facts.map((line) => lineWidth(setup, line, scaled(usual, share)) + 2 * padAcross)
  const share = sizes.find((each) => sum(needed(each)) <= width) ?? sizes.at(-1) ?? 1
  const widths = shared(needed(share), facts.map(hasBlank), width)
  const style = scaled(usual, share)
  const set = facts.map((line, i) => {
    const room = (widths[i] ?? 0) - 2 * padAcross
    return setLine(setup, lengthened(setup, line, style, room), style, { width: room })
  })
  const height = Math.max(0, ...set.map((line) => line.height)) + 2 * (density.cellPad + 1.5)
  return {
    height,
    draw: (x, y) => {
      let at = x
      set.forEach((line, i) => {
        if (i > 0)
          setup.doc
            .moveTo(at, y)
            .lineTo(at, y + height)
            .undash()
            .lineWidth(0.8)
            .stroke('#000')
        line.draw(at + padAcross, y + (height - line.height) / 2)
        at += widths[i] ?? 0
      })
      setup.doc.rect(x, y, width, height).undash().lineWidth(1.5).stroke('#000')
    },
  }
}

const sum = (numbers: readonly number[]) => numbers.reduce((total, each) => total + each, 0)

const hasBlank = (line: Line) => line.some((piece) => typeof piece === 'string' && /_{3,}/.test(piece))

/** What is left over goes to the cells, threefold to those with a blank; what is too much is taken off each by its length. */
function shared(needed: readonly number[], blanks: readonly boolean[], width: number): number[] {
  const all = sum(needed)
  if (all > width) return needed.map((each) => (each * width) / all)
  const weights = blanks.map((isBlank) => (isBlank ? 3 : 1))
  return needed.map((each, i) => each + ((width - all) * (weights[i] ?? 1)) / sum(weights))
}

/** A blank to write on takes what its cell has left over. */
function lengthened(setup: Setup, line: Line, style: Style, room: number): Line {
  const more = Math.floor((room - lineWidth(setup, line, style)) / (blankShare * style.plain.size))
  return more < 1
    ? line
    : line.map((piece) =>
        typeof piece === 'string' ? piece.replace(/_{3,}/, (blank) => blank + blankRule(more)) : piece,
      )
}
