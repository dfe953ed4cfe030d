import { toDegrees, cosDeg } from '../angles'
import type { PieceEnd } from '../piece'

/** A piece to lay in a bar, seen from the side: ends A and B, and its blank tip to tip. Inches. */
export interface NestPiece {
  mark: string
  overall: number
  endA: PieceEnd
  endB: PieceEnd
}

/** A piece as it lies in the bar; top and underside are the stick's, measured from its first cut. */
export interface NestedPiece {
  mark: string
  /** End B lies first. */
  turnedEndForEnd: boolean
  /** Its top lies on the underside of the stick. */
  rolled: boolean
  topStart: number
  topEnd: number
  undersideStart: number
  undersideEnd: number
}

export interface BarNest {
  pieces: NestedPiece[]
  /** From the first tip to the last. */
  length: number
  /** Against the same pieces laid tip to tip with a kerf between; a hair below 0 where nothing nests. */
  saved: number
}

type EndName = 'endA' | 'endB'
interface PlacedEnd {
  piece: number
  end: EndName
}

const setbackOf = (pieces: readonly NestPiece[], { piece, end }: PlacedEnd) => pieces[piece]?.[end].setback ?? 0
const otherEnd = (end: EndName): EndName => (end === 'endA' ? 'endB' : 'endA')

/** Pairs of ends that share the most, the largest first; each piece keeps two neighbours and the bar one row. */
function joinEnds(pieces: readonly NestPiece[]): [PlacedEnd, PlacedEnd][] {
  const ends = pieces
    .flatMap((_, piece): PlacedEnd[] => [
      { piece, end: 'endA' },
      { piece, end: 'endB' },
    ])
    .sort((a, b) => setbackOf(pieces, b) - setbackOf(pieces, a))
  const row = pieces.map((_, piece) => piece)
  const joined = new Set<PlacedEnd>()
  const pairs: [PlacedEnd, PlacedEnd][] = []
  for (const [i, a] of ends.entries()) {
    if (joined.has(a)) continue
    const b = ends.slice(i + 1).find((end) => !joined.has(end) && row[end.piece] !== row[a.piece])
    if (!b) continue
    const [keep, merge] = [row[a.piece] ?? 0, row[b.piece] ?? 0]
    for (const [piece, name] of row.entries()) if (name === merge) row[piece] = keep
    joined.add(a).add(b)
    pairs.push([a, b])
  }
  return pairs
}

/** Follows the pairs from a free end: each step names a piece and the end that lies first. */
function rowOf(pieces: readonly NestPiece[], pairs: readonly [PlacedEnd, PlacedEnd][]): PlacedEnd[] {
  const partner = ({ piece, end }: PlacedEnd) =>
    pairs
      .map(([a, b]): [PlacedEnd, PlacedEnd] => (b.piece === piece && b.end === end ? [b, a] : [a, b]))
      .find(([a]) => a.piece === piece && a.end === end)?.[1]
  const free = pieces
    .flatMap((_, piece): PlacedEnd[] => [
      { piece, end: 'endA' },
      { piece, end: 'endB' },
    ])
    .find((end) => !partner(end))
  const row: PlacedEnd[] = []
  for (let first = free; first && row.length < pieces.length; first = partner({ ...first, end: otherEnd(first.end) })) {
    row.push(first)
  }
  return row
}

/** How far the cut stands back on the stick's top (side +1) or underside (-1). */
const standsBack = ({ setback, face }: PieceEnd, side: 1 | -1, rolled: boolean) => {
  const longHere = (face === 'top') !== rolled ? 1 : -1
  return face === 'square' || longHere === side ? 0 : setback
}

/** Lays one piece with its first tip at 0; rolled when that turns its first cut parallel to the cut before. */
function layAtZero(piece: NestPiece, first: EndName, rolled: boolean): NestedPiece {
  const start = piece[first]
  const end = piece[otherEnd(first)]
  return {
    mark: piece.mark,
    turnedEndForEnd: first === 'endB',
    rolled,
    topStart: standsBack(start, 1, rolled),
    undersideStart: standsBack(start, -1, rolled),
    topEnd: piece.overall - standsBack(end, 1, rolled),
    undersideEnd: piece.overall - standsBack(end, -1, rolled),
  }
}

/** A blade takes its kerf square to the cut, so more along the stick where the cut is mitered. */
const kerfAlong = (kerf: number, setback: number, depth: number) => kerf / cosDeg(toDegrees(Math.atan2(setback, depth)))

/** Where the next piece may start: both cuts of the gap find their kerf, on top and underneath. */
function nextStart(before: NestedPiece, next: NestedPiece, kerf: number, depth: number): number {
  const steepest = Math.max(
    Math.abs(before.topEnd - before.undersideEnd),
    Math.abs(next.topStart - next.undersideStart),
  )
  const clear = Math.max(before.topEnd - next.topStart, before.undersideEnd - next.undersideStart)
  return clear + kerfAlong(kerf, steepest, depth)
}

function slide(piece: NestedPiece, by: number): NestedPiece {
  return {
    ...piece,
    topStart: piece.topStart + by,
    topEnd: piece.topEnd + by,
    undersideStart: piece.undersideStart + by,
    undersideEnd: piece.undersideEnd + by,
  }
}

const tip = ({ topEnd, undersideEnd }: NestedPiece) => Math.max(topEnd, undersideEnd)

/**
 * Lays the pieces of one bar nose to tail, so that neighbours with opposite cuts share what they can.
 * Pieces are turned end for end and rolled at will: molded stock cannot be rolled and must not use this.
 * Greedy, so a shorter layout may exist; never overlaps, and always leaves the kerf. `depth` as seen from the side.
 */
export function nestBar(pieces: readonly NestPiece[], kerf: number, depth: number): BarNest {
  const laid: NestedPiece[] = []
  for (const { piece: index, end } of rowOf(pieces, joinEnds(pieces))) {
    const piece = pieces[index]
    if (!piece) continue
    const before = laid.at(-1)
    const upright = layAtZero(piece, end, false)
    if (!before) {
      laid.push(upright)
      continue
    }
    const ways = [upright, layAtZero(piece, end, true)].map((way) => slide(way, nextStart(before, way, kerf, depth)))
    laid.push(ways.reduce((best, way) => (tip(way) < tip(best) - 1e-9 ? way : best)))
  }
  const length = Math.max(0, ...laid.map(tip))
  const tipToTip = pieces.reduce((sum, { overall }) => sum + overall + kerf, -kerf)
  return { pieces: laid, length, saved: tipToTip - length }
}
