import { tubeJointSymbol } from '../sheet/weld-symbol'
import type { Pdf } from './faces'
import type { Part } from './set-line'
import { widthOf, write } from './write'

const usual = 0.78

/** The welding symbol of a tube joint, drawn; smaller where the column is narrow. */
export function weldSymbol(doc: Pdf, width: number): Part {
  const { lines, circle, arrowhead, words, ...size } = tubeJointSymbol
  const share = Math.min(usual, width / size.width)
  return {
    height: size.height * share + 3,
    draw: (x, y) => {
      const spot = ([across, down]: readonly [number, number]): [number, number] => [
        x + across * share,
        y + down * share,
      ]
      doc.lineWidth(0.9).lineJoin('miter').undash()
      for (const [first, ...rest] of lines) {
        if (!first) continue
        doc.moveTo(...spot(first))
        for (const next of rest) doc.lineTo(...spot(next))
        doc.stroke('#000')
      }
      doc.circle(...spot(circle.at), circle.radius * share).stroke('#000')
      doc.polygon(...arrowhead.map(spot)).fill('#000')
      for (const { at, text, size: px, centred } of words) {
        const [across, down] = spot(at)
        const points = px * share * 1.1
        const shift = centred ? widthOf(doc, 'word', points, text) / 2 : 0
        write(doc, text, { face: 'word', size: points, x: across - shift, y: down })
      }
    },
  }
}
