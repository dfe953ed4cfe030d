import type { HandrailOutputs } from '@/lib/trade/rail/types'
import type { List } from './sheet'

/** The joints with the angle to hold, the weld around them, and what filler they take. */
export function jointList({ joints, parts, returns, weld }: HandrailOutputs): List {
  const around = [...joints.map(({ perimeter }) => perimeter), ...returns.map((piece) => piece.weld)]
  const filler = weld ? `; ${weld.fillerLb.toFixed(2)} lb of filler to buy` : ''
  const total = around.reduce((sum, length) => sum + length, 0)
  return {
    title: 'Joints',
    symbol: 'tube joint',
    rows: [
      ...joints.map(({ included, longPointFace }, i) => ({
        name: `${parts[i]?.mark}–${parts[i + 1]?.mark}`,
        line: ['hold ', { strong: `${included.toFixed(1)}°` }, longPointFace === 'none' ? ', straight on' : ''],
      })),
      ...returns.map(({ end }) => ({
        name: `${(end === 'bottom' ? parts[0] : parts.at(-1))?.mark}–return`,
        line: ['hold ', { strong: '90.0°' }, ' in plan'],
      })),
      {
        name: 'Weld',
        line: around.length === 0 ? ['none: one piece'] : [`all round, ground flush; ${total.toFixed(1)} in${filler}`],
      },
    ],
  }
}
