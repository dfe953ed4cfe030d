import type { Style } from './words'

/** How closely a sheet is set, points. */
export interface Density {
  text: number
  small: number
  number: number
  mark: number
  tableHead: number
  heading: number
  /** Between blocks. */
  gap: number
  /** Over and under what stands in a cell, and in a row of a list. */
  cellPad: number
  rowPad: number
  /** The least height of the main picture that is worth the room at this density. */
  picture: number
}

/** Sizes shrink by the share, but never below what is read at arm's length. */
function density(share: number, picture: number): Density {
  const size = (usual: number, least: number) => Math.max(usual * share, least)
  return {
    text: size(9.6, 7.6),
    small: size(7.8, 6.4),
    number: size(13.2, 9.6),
    mark: size(20, 13),
    tableHead: size(10, 8),
    heading: size(12.4, 9.6),
    gap: size(12, 5),
    cellPad: size(4.2, 1),
    rowPad: size(3, 0.8),
    picture,
  }
}

/** The least that shows a rail with its lengths readable. */
export const leastPicture = 110

/** From a sheet with room to spare to a crowded one. */
export const densities: readonly Density[] = [
  density(1.12, 280),
  density(1, 205),
  density(0.94, 195),
  density(0.88, 180),
  density(0.8, 160),
  density(0.72, 140),
  density(0.64, leastPicture),
  density(0.5, leastPicture),
]

const words = (size: number): Style => ({
  plain: { face: 'text', size },
  strong: { face: 'bold', size },
  number: size * 1.18,
})

/** Running words, and small ones under them. */
export const textStyle = ({ text }: Density): Style => words(text)
export const smallStyle = ({ small }: Density): Style => words(small)
/** Heads and marks, in one face throughout. */
export const headStyle = (size: number): Style => ({
  plain: { face: 'word', size },
  strong: { face: 'word', size },
  number: size,
})
/** The numbers that go to the saw, with their words beside them in the narrow face. */
export const numberStyle = (size: number): Style => ({
  plain: { face: 'word', size: size * 0.84 },
  strong: { face: 'mono', size: size * 0.94 },
  number: size,
})
/** Any style in other sizes. */
export const scaled = ({ plain, strong, number }: Style, share: number): Style => ({
  plain: { ...plain, size: plain.size * share },
  strong: { ...strong, size: strong.size * share },
  number: number * share,
})
