import type { Precision } from '@/lib/calculators/fields'
import type { Sketch } from '@/lib/drawing/sketch'
import type { Preferences } from '@/lib/schemas/account'

/** How the reader of a sheet reads it: tape, dial, units first, and what the saw calls square. */
export interface SheetReading {
  precision: Precision
  preferences: Pick<Preferences, 'units' | 'sawSquare'>
}

/** A bit of a line. Lengths in inches and angles in degrees stay numbers, so that fractions are set as fractions. */
export type Piece = string | { strong: string } | { tape: number } | { dial: number } | { face: 'top' | 'underside' }
export type Line = readonly Piece[]

/** A blank to write on with a pencil, about so many characters wide. */
export const blankRule = (characters: number): string => '_'.repeat(characters)

export interface Cell {
  line: Line
  /** Small, under the line. */
  under?: Line
  /** A square to tick. */
  box?: true
}

export interface Column {
  head: string
  /** Second line of the head. */
  under?: string
  /** Its part of the table's width, by weight. */
  share: number
  /** How its lines are set: the part's name, a number for the hand, or words. */
  as: 'mark' | 'number' | 'words'
}

export interface Table {
  kind: 'table'
  title: string
  columns: readonly Column[]
  rows: readonly (readonly Cell[])[]
  /** What the signs mean. */
  key?: Line
}

export interface List {
  title: string
  rows: readonly { name: string; line: Line; under?: Line }[]
  /** The welding symbol that stands for every row. */
  symbol?: 'tube joint'
}

export interface Picture {
  kind: 'picture'
  title: string
  /** Over the picture. */
  says?: string
  sketch: Sketch
  /** The main picture takes what room is left; a strip its own height. */
  as: 'main' | 'strip'
}

/** Lists beside each other where the paper is wide enough. */
export interface Lists {
  kind: 'lists'
  lists: readonly List[]
}

/** What must be seen before anything is cut. */
export interface Remarks {
  kind: 'remarks'
  lines: readonly Line[]
}

export type Block = Picture | Table | Lists | Remarks

/** A sheet of paper, before it knows whether it is a screen, a printer or a PDF. */
export interface Sheet {
  title: string
  under: string
  /** Right of the title: when, by whom, with what. */
  particulars: readonly Line[]
  /** The hand going up, in an inch-high letter. */
  hand?: 'L' | 'R'
  /** The revision that stands in its place. */
  supersededBy?: number
  facts: readonly Line[]
  blocks: readonly Block[]
  cautions: readonly Line[]
  /** Where it is found again; also as a QR code. */
  address: string
  reading: SheetReading
}

/** What stands at the head of a sheet beside its numbers; empty texts are blanks to write on. */
export interface SheetHead {
  job: string
  place: string
  sheet: string
  measuredBy: string
  /** Year, month, day. */
  measuredOn: string
  instrument: string
  /** Of a sheet kept in a job: its number there, its revision, what changed, and what replaced it. */
  kept?: { sheet: number; revision: number; note: string; supersededBy?: number }
}

export const blankHead: SheetHead = { job: '', place: '', sheet: '', measuredBy: '', measuredOn: '', instrument: '' }

/** Second line of the title: which rail, which sheet, which revision, what changed. */
export function underTitle({ sheet, place, kept }: SheetHead): string {
  const number = kept && [`sheet ${kept.sheet}`, `revision ${kept.revision}${kept.note ? `: ${kept.note}` : ''}`]
  return [sheet, place, ...(number ?? [])].filter((part) => part !== '').join(' · ')
}

/** When, by whom and with what it was measured; what is not known is left to the pencil. */
export function particularsOf({ measuredBy, measuredOn, instrument }: SheetHead): Line[] {
  const known = (text: string, blank: number): Piece => (text === '' ? blankRule(blank) : { strong: text })
  return [
    ['Measured ', known(measuredOn, 12)],
    ['by ', known(measuredBy, 16)],
    ['with ', known(instrument, 16)],
  ]
}
