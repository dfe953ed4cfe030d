import type { Remarks } from '../sheet/sheet'
import { textStyle, type Density } from './density'
import { stack } from './flow'
import { setLine, type Part, type Setup } from './set-line'

const pad = 6
const indent = 12

/** What must be seen before anything is cut, boxed and bold. */
export function remarksOf(setup: Setup, { lines }: Remarks, width: number, density: Density): Part {
  const style = textStyle(density)
  const rows = lines.map((line): Part => {
    const set = setLine(setup, line, { ...style, plain: style.strong }, { width: width - 2 * pad - indent })
    return {
      height: set.height + 1,
      draw: (x, y) => {
        setup.doc.circle(x + pad + 3, y + style.plain.size * 0.6, 1.8).fill('#000')
        set.draw(x + pad + indent, y)
      },
    }
  })
  const all = stack(rows)
  return {
    height: all.height + 2 * (density.rowPad + 1.5),
    draw: (x, y) => {
      setup.doc
        .rect(x, y, width, all.height + 2 * (density.rowPad + 1.5))
        .undash()
        .lineWidth(1.5)
        .stroke('#000')
      all.draw(x, y + density.rowPad + 1.5)
    },
  }
}
