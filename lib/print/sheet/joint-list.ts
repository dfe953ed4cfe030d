import type { HandrailOutputs } from '@/lib/trade/rail/types'
import type { Line, List } from './sheet'

/** The joints with the angle to hold, the weld around them, and what filler they take. */
export function jointList({ joints, parts, returns, weld }: HandrailOutputs): List {
  const around = [...joints.map(({ perimeter }) => perimeter), ...returns.map((piece) => piece.weld)]
  const filler = weld ? `; ${weld.fillerLb.toFixed(2)} lb of filler to buy` : ''
  const total = around.reduce((sum, length) => sum + length, 0)
  // A joint and its angle stay on one row.
  const held: Line[] = [
    ...joints.map(({ included }, i): Line => [
      `${parts[i]?.mark}–\u2060${parts[i + 1]?.mark}\u00a0`,
      { strong: `${included.toFixed(1)}°` },
    ]),
    ...returns.map(({ end }): Line => [
      `${(end === 'bottom' ? parts[0] : parts.at(-1))?.mark}–return\u00a0`,
      { strong: '90.0°' },
      ' in plan',
    ]),
  ]
  if (held.length === 0) return { title: 'Joints', rows: [{ name: 'None', line: ['the rail is one piece'] }] }
  return {
    title: 'Joints',
    symbol: 'tube joint',
    rows: [
      { name: 'Hold', line: held.flatMap((line, i) => (i > 0 ? [' · ', ...line] : line)) },
      { name: 'Weld', line: [`all round, ground flush; ${total.toFixed(1)} in${filler}`] },
    ],
  }
}
