import type { Part } from './set-line'

/** What stands between head and foot: as high as it is, and where a page ends it may be parted between its rows. */
export interface Flow {
  height: number
  /** As much as the room holds, and what is left for the next page; null when the room holds nothing of it. */
  take: (room: number) => { part: Part; rest: Flow | null } | null
}

/** A flow that stands on one page. */
export const whole = (part: Part): Flow => ({
  height: part.height,
  take: (room) => (part.height <= room ? { part, rest: null } : null),
})

/** Parts under each other as one. */
export function stack(parts: readonly Part[]): Part {
  return {
    height: parts.reduce((sum, { height }) => sum + height, 0),
    draw: (x, y) => {
      let at = y
      for (const part of parts) {
        part.draw(x, at)
        at += part.height
      }
    },
  }
}

interface Rows {
  /** Said again on every page. */
  top: Part
  rows: readonly Part[]
  /** After the last row. */
  end?: Part
}

/** Rows under a head. Where a page ends, the head comes again over the rows that are left. */
export function rowsFlow({ top, rows, end }: Rows): Flow {
  const all = stack([top, ...rows, ...(end ? [end] : [])])
  return {
    height: all.height,
    take: (room) => {
      if (all.height <= room) return { part: all, rest: null }
      let height = top.height
      // The end stands under a row at least, never alone.
      const held = rows.slice(0, -1).findIndex((row) => (height += row.height) > room)
      const count = held < 0 ? rows.length - 1 : held
      if (count < 1) return null
      return {
        part: stack([top, ...rows.slice(0, count)]),
        rest: rowsFlow({ top, rows: rows.slice(count), ...(end ? { end } : {}) }),
      }
    },
  }
}

/** Flows beside each other, each at its own distance from the left. */
export function besideFlow(flows: readonly { flow: Flow; left: number }[]): Flow {
  return {
    height: Math.max(0, ...flows.map(({ flow }) => flow.height)),
    take: (room) => {
      const taken = flows.map(({ flow, left }) => ({ left, flow, taken: flow.take(room) }))
      if (taken.every((each) => each.taken === null)) return null
      const parts = taken.flatMap(({ left, taken: each }) => (each ? [{ left, part: each.part }] : []))
      const rest = taken.flatMap(({ left, flow, taken: each }) => {
        const left_ = each ? each.rest : flow
        return left_ ? [{ left, flow: left_ }] : []
      })
      return {
        part: {
          height: Math.max(...parts.map(({ part }) => part.height)),
          draw: (x, y) => parts.forEach(({ left, part }) => part.draw(x + left, y)),
        },
        rest: rest.length > 0 ? besideFlow(rest) : null,
      }
    },
  }
}
