import type { Letter, Spot } from './pdf-content'
import type { ReadPage } from './pdf-reader'

/** Letters of a page that show nothing where they should: a box of the font, or an empty outline. */
export const emptyLetters = ({ letters }: ReadPage): Letter[] =>
  letters.filter(({ drawn, text }) => !drawn && text !== ' ' && text !== '\u00a0')

/** What is seen nearer to the edge of the paper than `white` points. */
export function beyond({ letters, paths, width, height }: ReadPage, white: number): Spot[] {
  const seen = paths.filter(({ stroked, colour }) => stroked || colour !== '1 1 1')
  const spots = [...letters.flatMap(({ corners }) => corners), ...seen.flatMap(({ points }) => points)]
  return spots.filter(({ x, y }) => !(x >= white && y >= white && x <= width - white && y <= height - white))
}

/** Neighbours in a word may meet by so much of their size: accents of Î and Ï do. */
const touch = 0.06

/** Pairs of level letters that lie on each other. A fraction's slash leans over its figures and is left out, as is what is set behind all. */
export function overlapping({ letters }: ReadPage): string[] {
  const level = letters.filter(
    ({ from, to, text, colour, drawn }) => drawn && text !== '⁄' && Math.abs(from.y - to.y) < 0.01 && !isPale(colour),
  )
  const boxes = level.map(({ text, size, corners }) => ({
    text,
    left: Math.min(...corners.map(({ x }) => x)) + touch * size,
    right: Math.max(...corners.map(({ x }) => x)) - touch * size,
    low: Math.min(...corners.map(({ y }) => y)) + touch * size,
    high: Math.max(...corners.map(({ y }) => y)) - touch * size,
  }))
  return boxes.flatMap((a, i) =>
    boxes
      .slice(i + 1)
      .filter((b) => a.left < b.right && b.left < a.right && a.low < b.high && b.low < a.high)
      .map((b) => `${a.text} on ${b.text} at ${a.left.toFixed(0)}, ${a.low.toFixed(0)}`),
  )
}

/** Set behind everything else, to be read through. */
export const isPale = (colour: string): boolean =>
  Number(colour.split(' ')[0]) > 0.8 && Number(colour.split(' ')[0]) < 1

/** The stroked path that is a ruler of three inches: its left end and how long it is, points. */
export function rulerOf({ paths }: ReadPage): { length: number; ticks: number[]; level: boolean } | undefined {
  return paths
    .filter(({ stroked, points }) => stroked && points.length === 10)
    .map(({ points: [from, to, ...ticks] }) => {
      const left = from?.x ?? 0
      return {
        length: (to?.x ?? 0) - left,
        level: from?.y === to?.y,
        ticks: ticks.flatMap(({ x }, i) => (i % 2 === 0 ? [x - left] : [])),
      }
    })[0]
}
