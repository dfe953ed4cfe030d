import type { List, Lists } from '../sheet/sheet'
import { smallStyle, textStyle, type Density } from './density'
import { fitted } from './fit'
import { besideFlow, blank, rowsFlow, stack, type Flow } from './flow'
import { lineWidth, setLine, type Part, type Setup } from './set-line'
import { weldSymbol } from './weld-symbol'

const apart = 20
const inset = 2

/** Lists in two columns; a lone one takes the whole width. */
export function listsOf(setup: Setup, { lists }: Lists, width: number, density: Density): Flow {
  if (lists.length === 1)
    return besideFlow(lists.map((list) => ({ flow: listOf(setup, list, width, density), left: 0 })))
  const column = (width - apart) / 2
  const flows = lists.map((list) => listOf(setup, list, column, density))
  const pairs = flows.flatMap((flow, i) => (i % 2 === 0 ? [[flow, flows[i + 1]]] : []))
  return under(
    pairs.map((pair) => besideFlow(pair.flatMap((flow, i) => (flow ? [{ flow, left: i * (column + apart) }] : [])))),
    density.gap,
  )
}

/** Flows under each other. */
function under([first, ...rest]: readonly Flow[], gap: number): Flow {
  if (!first) return { height: 0, take: () => ({ part: stack([]), rest: null }) }
  if (rest.length === 0) return first
  const later = under(rest, gap)
  return {
    height: first.height + gap + later.height,
    take: (room, isFresh) => {
      const taken = first.take(room, isFresh)
      if (!taken) return null
      if (taken.rest) return { part: taken.part, rest: under([taken.rest, ...rest], gap) }
      const next = later.take(room - taken.part.height - gap)
      return next
        ? { part: stack([taken.part, blank(gap), next.part]), rest: next.rest }
        : { part: taken.part, rest: later }
    },
  }
}

function listOf(setup: Setup, { title, rows, symbol }: List, width: number, density: Density): Flow {
  const heading = fitted(setup, title, width, [
    [density.heading, 1],
    [density.heading * 0.88, 1],
    [density.heading, 3],
  ])
  const top = stack([heading, blank(2), ...(symbol ? [weldSymbol(setup.doc, width)] : [])])
  const name = nameWidth(setup, rows, width, density)
  return rowsFlow({ top, rows: rows.map((row) => rowOf(setup, row, { width, name }, density)) })
}

/** Names stand in a column of their own, up to two fifths of the list. */
function nameWidth(setup: Setup, rows: List['rows'], width: number, density: Density): number {
  const widest = Math.max(0, ...rows.map(({ name }) => lineWidth(setup, [{ strong: name }], textStyle(density))))
  return widest === 0 ? 0 : Math.min(widest + 10, width * 0.4)
}

function rowOf(
  setup: Setup,
  row: List['rows'][number],
  { width, name }: { width: number; name: number },
  density: Density,
): Part {
  const style = textStyle(density)
  const room = width - name - 2 * inset
  const named = setLine(setup, [{ strong: row.name }], style, { width: Math.max(1, name - 6) })
  const line = setLine(setup, row.line, style, { width: room })
  const said = stack([line, ...(row.under ? [setLine(setup, row.under, smallStyle(density), { width: room })] : [])])
  // Numbers are larger than names: both stand on one baseline.
  const lower = Math.max(0, line.baseline - named.baseline)
  const height = Math.max(named.height + lower, said.height) + 2 * density.rowPad
  return {
    height,
    draw: (x, y) => {
      if (name > 0) named.draw(x + inset, y + density.rowPad + lower)
      said.draw(x + inset + name, y + density.rowPad)
      setup.doc
        .moveTo(x, y + height)
        .lineTo(x + width, y + height)
        .undash()
        .lineWidth(0.5)
        .stroke('#999')
    },
  }
}
