import { headStyle } from './density'
import { setLine, type Setting, type Setup } from './set-line'

/** A size to try, points, and how many rows it may take. */
export type Try = readonly [size: number, rows: number]

/** A head in the first size whose rows hold it; past the last one it ends in an ellipsis. */
export function fitted(
  setup: Setup,
  text: string,
  width: number,
  [first, ...further]: readonly [Try, ...Try[]],
): Setting {
  const [size, most] = first
  const set = setLine(setup, [text], headStyle(size), { width, most })
  const [next, ...later] = further
  return set.cut && next ? fitted(setup, text, width, [next, ...later]) : set
}
