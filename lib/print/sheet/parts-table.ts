import type { HandrailOutputs, PartEnd, RailPart, RailReturn } from '@/lib/trade/rail/types'
import { sawReading } from '@/lib/trade/rail/words'
import type { Cell, Column, Line, SheetReading, Table } from './sheet'

const columns: readonly Column[] = [
  { head: 'Mark', share: 8, as: 'mark' },
  { head: 'Qty', share: 3.5, as: 'words' },
  { head: 'Top edge', under: 'same face', share: 14, as: 'number' },
  { head: 'Underside', under: 'same face', share: 14, as: 'number' },
  { head: 'Blank', under: 'tip to tip', share: 14, as: 'number' },
  { head: 'Low end', under: 'saw, long point', share: 15, as: 'number' },
  { head: 'High end', under: 'saw, long point', share: 15, as: 'number' },
  { head: 'Between', under: 'cuts', share: 9.5, as: 'words' },
  { head: 'Cut', share: 4, as: 'words' },
  { head: 'Chk', share: 4, as: 'words' },
]

/** Every part and return in cutting order, with its saw settings, faces and boxes to tick. */
export function partsTable({ parts, returns }: HandrailOutputs, reading: SheetReading): Table {
  return {
    kind: 'table',
    title: 'Parts',
    columns,
    rows: [...parts.map((part) => partRow(part, reading)), ...returns.map((piece) => returnRow(piece, parts, reading))],
    key: keyOf(parts, returns, reading),
  }
}

const tick: Cell = { line: [], box: true }
const word = (text: string): Cell => ({ line: [text] })
const exactly = (inches: number): Line => [inches.toFixed(3)]
const length = (inches: number): Cell => ({ line: [{ tape: inches }], under: exactly(inches) })

function partRow(part: RailPart, { preferences: { sawSquare } }: SheetReading): Cell[] {
  return [
    { line: [{ strong: part.mark }], under: [part.kind] },
    word('1'),
    length(part.topEdge),
    length(part.underside),
    length(part.overall),
    endCell(part.endA, sawSquare),
    endCell(part.endB, sawSquare),
    betweenCell(part),
    tick,
    tick,
  ]
}

function endCell({ longPoint, saw, exact }: PartEnd, sawSquare: 0 | 90): Cell {
  if (longPoint === 'square') return { line: [{ strong: 'square' }] }
  const reads = { dial: sawReading(saw, sawSquare) }
  const under = `${Number(sawReading(exact, sawSquare).toFixed(2))}° exactly`
  if (longPoint === 'room side (plan)') return { line: [reads, ' in plan'], under: ['long on room side'] }
  return { line: [reads, ' ', { face: longPoint }, longPoint === 'top' ? ' top' : ' under'], under: [under] }
}

/** What the hand does between the two cuts of a part; nothing where one way of lying on the saw serves both. */
function betweenCell({ cuts, turn }: RailPart): Cell {
  const handling = cuts.startsWith('parallel') ? 'SLIDE' : cuts.startsWith('opposed') ? 'ROLL' : ''
  const words = [handling, turn ? 'TURN' : ''].filter((word) => word !== '').join(', ')
  return { line: words ? [{ strong: words }] : ['–'] }
}

const isRolled = ({ rolledWithRake }: RailReturn) => Math.abs(rolledWithRake) >= 0.005

/** A return is cut once in plan and once square; its edges are its long and short point. */
function returnRow(
  piece: RailReturn,
  parts: readonly RailPart[],
  { preferences: { sawSquare } }: SheetReading,
): Cell[] {
  const part = piece.end === 'bottom' ? parts[0] : parts.at(-1)
  return [
    { line: [{ strong: `${part?.mark ?? ''}r` }], under: ['return'] },
    word('1'),
    { line: [{ tape: piece.longPoint }], under: ['long point'] },
    { line: [{ tape: piece.shortPoint }], under: ['short point'] },
    length(piece.longPoint),
    { line: [{ dial: sawReading(45, sawSquare) }, ' in plan'], under: [`turns ${piece.turns}`] },
    { line: [{ strong: 'square' }], under: ['at the wall'] },
    isRolled(piece) ? { line: [{ strong: 'RAKE' }], under: [`${piece.rolledWithRake.toFixed(2)}°`] } : word('–'),
    tick,
    tick,
  ]
}

function keyOf(parts: readonly RailPart[], returns: readonly RailReturn[], { precision }: SheetReading): Line {
  const ends = parts.flatMap(({ endA, endB }) => [endA.longPoint, endB.longPoint])
  const said = (kind: string) => parts.some(({ cuts }) => cuts.startsWith(kind))
  return [
    ...(ends.includes('top') ? [{ face: 'top' } as const, ' long on top   '] : []),
    ...(ends.includes('underside') ? [{ face: 'underside' } as const, ' long underneath   '] : []),
    ...(said('parallel') ? ['SLIDE: slide the stock, do not roll it   '] : []),
    ...(said('opposed') ? ['ROLL: roll the stock half over between cuts   '] : []),
    ...(parts.some(({ turn }) => turn) ? ['TURN: turn the stock a quarter between cuts   '] : []),
    ...(returns.some(isRolled) ? ['RAKE: roll the return with the rake by the angle under it   '] : []),
    ...notesOf(parts),
    `lengths to 1/${precision.tape}, exact inches small`,
  ]
}

/** What was added for a return or taken off for a volute, each once with the parts it is said of. */
function notesOf(parts: readonly RailPart[]): Line {
  const notes = new Set(parts.flatMap(({ note }) => note ?? []))
  return [...notes].map((note) => {
    const marks = parts.filter((part) => part.note === note).map(({ mark }) => mark)
    return `${marks.join(', ')}: ${note}   `
  })
}
