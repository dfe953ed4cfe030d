import { cutList } from '../cut-list/cut-list'
import { nestBar, type NestPiece } from '../cut-list/nest'
import type { PieceEnd } from '../piece'
import { isRefusal, refuse, type Refusal } from '../refusal'
import { hair } from '../tolerance'
import type { PartEnd, RailPart, RailReturn, RailSticks, RailWarning, Section, StockGiven } from './types'

/** A plan cut looks square from the side, and its blank counts to the tip. */
const seenFromTheSide = ({ longPoint }: PartEnd, setback: number): PieceEnd =>
  longPoint === 'room side (plan)' ? { setback: 0, face: 'square' } : { setback, face: longPoint }

function blanksOf(parts: readonly RailPart[], returns: readonly RailReturn[]): NestPiece[] {
  const square: PieceEnd = { setback: 0, face: 'square' }
  return [
    ...parts.map(({ mark, overall, endA, endB, setbackA, setbackB }) => ({
      mark,
      overall,
      endA: seenFromTheSide(endA, setbackA),
      endB: seenFromTheSide(endB, setbackB),
    })),
    ...returns.map(({ end, longPoint }) => ({ mark: `${end} return`, overall: longPoint, endA: square, endB: square })),
  ]
}

const tooLong = (marks: readonly string[]): RailWarning => ({
  field: 'stock.length',
  message: `${marks.join(', ')} ${marks.length === 1 ? 'is' : 'are'} longer than the stick: splice, clear of brackets, or buy longer stock.`,
})

/** Sticks for the parts and returns by their blanks; `null` with a warning when one is longer than the stick. */
export function cutSticks(
  stock: StockGiven,
  section: Section,
  parts: readonly RailPart[],
  returns: readonly RailReturn[],
): { sticks: RailSticks | null; warnings: RailWarning[] } | Refusal {
  const blanks = blanksOf(parts, returns)
  const usable = stock.length - (stock.trim ?? 0)
  const long = blanks.filter(({ overall }) => usable > 0 && overall > usable + hair)
  if (long.length > 0) {
    const names = long.map(({ mark }) => (mark.endsWith('return') ? `The ${mark}` : `Part ${mark}`))
    return { sticks: null, warnings: [tooLong(names)] }
  }
  const list = cutList({
    pieces: blanks.map(({ overall }) => overall),
    stock: stock.length,
    kerf: stock.kerf,
    trim: stock.trim,
  })
  if (isRefusal(list)) return refuse(list.field === 'stock' ? 'stock.length' : `stock.${list.field}`, list.message)
  const laid = list.at.map((bar) => bar.flatMap((place) => blanks[place] ?? []))
  const { sticks, bars, drops, yieldPct, bound, proved } = list
  return {
    sticks: {
      ...{ sticks, bars, drops, yieldPct, bound, proved },
      marks: laid.map((bar) => bar.map(({ mark }) => mark)),
      nested: laid.map((bar) => nestBar(bar, stock.kerf, section.depth)),
    },
    warnings: [],
  }
}
