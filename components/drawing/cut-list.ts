import type { Drawing, LabelRequest, Show, Stroke } from '@/lib/drawing/sketch'
import { outline, path, spot } from '@/lib/drawing/strokes'
import { length, number, plain, word } from '@/lib/drawing/text'
import type { BarNest, NestedPiece } from '@/lib/trade/cut-list/nest'

interface Given {
  stock: number
  kerf: number
  trim?: number | null
}
interface Solved {
  bars: readonly (readonly number[])[]
  drops: readonly number[]
  sticks: number
  yieldPct: number
  /** Mark of each piece, in the order of `bars`: handrail parts have them. */
  marks?: readonly (readonly string[])[]
  /** Mitered pieces laid nose to tail, where they were given. */
  nested?: readonly BarNest[]
}

/** Px of a bar and from one bar to the next: lengths are to scale, depths are not. */
const barHeight = 30
const rowHeight = 58
const mostRows = 14

interface Row {
  bar: readonly number[]
  drop: number
  marks: readonly string[]
  nest?: BarNest
  /** Sticks cut alike, counted from 1. */
  sticks: number[]
}

/** Bars to scale with kerfs, lengths and drops; sticks that are cut alike share a bar. */
export const draw: Drawing<Given, Solved> = (given, solved, show) => {
  const rows = rowsOf(solved)
  const shown = rows.slice(0, mostRows)
  return {
    strokes: shown.flatMap((row, i) => rowStrokes(given, row, i)),
    labels: [...shown.flatMap((row, i) => rowLabels(given, row, i, show)), ...more(rows.length - shown.length)],
    says: saysOf(given, solved, rows, show),
  }
}

function rowsOf({ bars, drops, marks, nested }: Solved): Row[] {
  const rows = new Map<string, Row>()
  for (const [i, bar] of bars.entries()) {
    const named = marks?.[i] ?? []
    const key = [...bar.map((piece) => piece.toFixed(6)), ...named].join(' ')
    const row = rows.get(key) ?? { bar, drop: drops[i] ?? 0, marks: named, nest: nested?.[i], sticks: [] }
    row.sticks.push(i + 1)
    rows.set(key, row)
  }
  return [...rows.values()]
}

/** One piece as it lies: its four corners along the stick. */
interface Laid {
  mark?: string
  size: number
  topStart: number
  topEnd: number
  underStart: number
  underEnd: number
}

function laidPieces({ bar, marks, nest }: Row, kerf: number): Laid[] {
  if (nest && nest.pieces.length === bar.length) return nest.pieces.map(nestedPiece)
  let start = 0
  return bar.map((size, i) => {
    const laid = {
      mark: marks[i],
      size,
      topStart: start,
      topEnd: start + size,
      underStart: start,
      underEnd: start + size,
    }
    start += size + kerf
    return laid
  })
}

function nestedPiece({ mark, topStart, topEnd, undersideStart, undersideEnd }: NestedPiece): Laid {
  const size = Math.max(topEnd, undersideEnd) - Math.min(topStart, undersideStart)
  return { mark, size, topStart, topEnd, underStart: undersideStart, underEnd: undersideEnd }
}

const bottomOf = (row: number) => -row * rowHeight

function rowStrokes({ stock, kerf, trim }: Given, row: Row, index: number): Stroke[] {
  const y = bottomOf(index)
  const pieces = laidPieces(row, kerf)
  const used = Math.max(0, ...pieces.map((p) => Math.max(p.topEnd, p.underEnd)))
  const usable = stock - (trim ?? 0)
  const corners = (a: number, b: number) => [
    spot(a, 0, 0, y),
    spot(b, 0, 0, y),
    spot(b, 0, 0, y - barHeight),
    spot(a, 0, 0, y - barHeight),
  ]
  return [
    ...hatch(Math.min(used + kerf, usable), usable, y, stock),
    ...(trim ? [outline('hatch', corners(usable, stock), 'solid', { passable: true })] : []),
    outline('dim', corners(0, stock)),
    ...pieces.map((p) =>
      outline(
        'object',
        [
          spot(p.topStart, 0, 0, y),
          spot(p.topEnd, 0, 0, y),
          spot(p.underEnd, 0, 0, y - barHeight),
          spot(p.underStart, 0, 0, y - barHeight),
        ],
        'face',
        { part: p.mark },
      ),
    ),
  ]
}

/** Slanted lines over what drops off; labels may lie on the grain. */
function hatch(from: number, to: number, y: number, stock: number): Stroke[] {
  const gap = stock / 90
  const lines: Stroke[] = []
  for (let x = from + gap; x < to - gap / 2; x += gap) {
    const lean = Math.min(gap * 1.6, x - from)
    const share = lean / (gap * 1.6)
    lines.push(path('hatch', [spot(x, 0, 0, y), spot(x - lean, 0, 0, y - barHeight * share)], { passable: true }))
  }
  return lines
}

function rowLabels({ stock, kerf }: Given, row: Row, index: number, show: Show): LabelRequest[] {
  const y = bottomOf(index) - barHeight / 2
  const many = row.sticks.length
  const name = many > 1 ? [number(`${many}×`)] : [number(String(row.sticks[0]))]
  const pieces = laidPieces(row, kerf).map(({ mark, size, topStart, topEnd, underStart, underEnd }): LabelRequest => {
    const from = spot(Math.max(topStart, underStart), 0, 0, y)
    const to = spot(Math.min(topEnd, underEnd), 0, 0, y)
    const shared = {
      kind: 'along',
      size: 'note',
      from,
      to,
      side: 'within',
      gap: 0,
      required: false,
      worth: 0.4,
      part: mark,
    } as const
    const name = mark ? [word(mark, 'text')] : []
    const whole = [[...name, ...(mark ? [word(' ')] : []), ...length(size, show)]]
    return { ...shared, text: whole, otherwise: mark ? { ...shared, text: [name] } : undefined }
  })
  return [
    {
      kind: 'at',
      text: [name],
      size: 'note',
      spot: spot(0, 0, 0, y),
      prefer: [180],
      gap: 10,
      reach: 10,
      required: true,
      leader: false,
    },
    ...pieces,
    ...(row.drop > 0
      ? [
          {
            kind: 'at',
            text: [[word('drop '), ...length(row.drop, show, 'quiet')]],
            size: 'note',
            spot: spot(stock, 0, 0, y - barHeight / 2),
            prefer: [-160, -165, -170],
            gap: 5,
            reach: 40,
            required: false,
            worth: 0.5,
            leader: false,
          } as const,
        ]
      : []),
  ]
}

function more(hidden: number): LabelRequest[] {
  if (hidden <= 0) return []
  return [
    {
      kind: 'at',
      text: [[word(`and ${hidden} more ways of cutting: the list has them all`)]],
      size: 'note',
      spot: spot(0, 0, 0, bottomOf(mostRows)),
      prefer: [0],
      gap: 4,
      required: true,
      leader: false,
    },
  ]
}

function saysOf({ stock }: Given, { sticks, yieldPct }: Solved, rows: readonly Row[], show: Show): string {
  const each = rows.map(({ bar, drop, sticks: which }) => {
    const name = which.length > 1 ? `Sticks ${which.join(', ')}` : `Stick ${which[0]}`
    return `${name}: ${bar.map((piece) => plain([length(piece, show)])).join(' + ')}, drop ${plain([length(drop, show)])}.`
  })
  return `${sticks} ${sticks === 1 ? 'stick' : 'sticks'} of ${plain([length(stock, show)])}, ${yieldPct.toFixed(0)} % used. ${each.join(' ')}`
}
