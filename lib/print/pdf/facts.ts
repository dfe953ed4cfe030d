import type { Line } from '../sheet/sheet'
import { scaled, textStyle, type Density } from './density'
import { lineWidth, setLine, type Part, type Setup } from './set-line'

const padAcross = 8
const sizes = [1, 0.92, 0.84, 0.78]

/** The facts in one boxed row. Cells take what they need; what is left goes first to those with a blank to write on. */
export function factsOf(setup: Setup, facts: readonly Line[], width: number, density: Density): Part {
  const usual = textStyle(density)
  const needed = (share: number) => facts.map((line) => lineWidth(setup, line, scaled(usual, share)) + 2 * padAcross)
  const share = sizes.find((each) => sum(needed(each)) <= width) ?? sizes.at(-1) ?? 1
  const widths = shared(needed(share), width)
  const style = scaled(usual, share)
  const set = facts.map((line, i) => setLine(setup, line, style, { width: (widths[i] ?? 0) - 2 * padAcross }))
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

/** What is left over in equal parts; what is too much taken off each by its length. */
function shared(needed: readonly number[], width: number): number[] {
  const whole = sum(needed)
  if (whole <= width) return needed.map((each) => each + (width - whole) / needed.length)
  return needed.map((each) => (each * width) / whole)
}
