import type { Ground } from './document'
import { headStyle } from './density'
import { setLine, type Part, type Setup } from './set-line'
import { widthOf, write } from './write'

/** The bar over a sheet that another revision replaced. */
export function supersededBar(setup: Setup, revision: number, width: number): Part {
  const says = `SUPERSEDED: revision ${revision} stands in its place. DO NOT CUT FROM THIS SHEET.`
  const set = setLine(setup, [says], headStyle(15), { width: width - 20, align: 'centre', colour: '#fff' })
  return {
    height: set.height + 8 + 9,
    draw: (x, y) => {
      setup.doc.rect(x, y, width, set.height + 8).fill('#000')
      set.draw(x + 10, y + 4)
    },
  }
}

/** The same across the page, behind everything and so pale that numbers stay readable over it. */
export function supersededAcross({ doc }: Setup, revision: number, { paper: [width, height] }: Ground): void {
  const says = `SUPERSEDED BY REVISION ${revision}`
  const size = (Math.hypot(width, height) * 0.74) / widthOf(doc, 'word', 1, says)
  doc.save()
  doc.translate(width / 2, height / 2).rotate((-Math.atan2(height, width) * 180) / Math.PI)
  write(doc, says, { face: 'word', size, x: -widthOf(doc, 'word', size, says) / 2, y: size * 0.35, colour: '#dcdcdc' })
  doc.restore()
}
