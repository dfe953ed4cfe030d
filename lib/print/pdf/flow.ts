import type { Part } from './set-line'

/** What stands between head and foot: as high as it is, and where a page ends it may be parted between its rows. */
export interface Flow {
  height: number
  /**
   * As much as the room holds, and what is left for the next page; null when the room holds nothing of it.
   * A fresh page holds no more than this one does: then less than is worth parting for is taken too.
   */
  take: (room: number, isFresh?: boolean) => Taken | null
}
export interface Taken {
  part: Part
  rest: Flow | null
}

/** A flow that stands on one page. */
export const whole = (part: Part): Flow => ({
  height: part.height,
  take: (room) => (part.height <= room ? { part, rest: null } : null),
})

/** Room left white. */
export const blank = (height: number): Part => ({ height, draw: () => {} })

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

/** Fewer rows than this under a head are not worth parting for. */
const fewest = 3

/** Rows under a head. Where a page ends, the head comes again over the rows that are left. */
export function rowsFlow({ top, rows, end }: Rows): Flow {
  const all = stack([top, ...rows, ...(end ? [end] : [])])
  return {
    height: all.height,
    take: (room, isFresh) => {
      if (all.height <= room) return { part: all, rest: null }
      let height = top.height
      // The end stands under a row at least, never alone.
      const held = rows.slice(0, -1).findIndex((row) => (height += row.height) > room)
      const count = held < 0 ? rows.length - 1 : held
      if (count < (isFresh ? 1 : Math.min(fewest, rows.length))) return null
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
    take: (room, isFresh) => {
      const taken = flows.map(({ flow, left }) => ({ left, flow, taken: flow.take(room, isFresh) }))
      if (taken.every((each) => each.taken === null)) return null
      const parts = taken.flatMap(({ left, taken: each }) => (each ? [{ left, part: each.part }] : []))
      const rest = taken.flatMap(({ left, flow, taken: each }) => {
        const still = each ? each.rest : flow
        return still ? [{ left, flow: still }] : []
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
