import type { CodeRow } from '../code-rows'
import type { ConsumablesAnswer } from '../consumables'
import type { ClosingVerdict } from '../field-check'
import type { MiterAnswer } from '../miter'
import type { EndFace, PieceDimensions } from '../piece'
import type { BarNest } from '../cut-list/nest'

export type * from './given'

/** x horizontal uphill from the bottom nosing, y up from it. */
export interface Point {
  x: number
  y: number
}

export interface PartEnd {
  /** On the dial, square is 0. */
  saw: number
  exact: number
  longPoint: EndFace | 'room side (plan)'
}
export type PartKind = 'bottom level' | 'rake' | 'landing' | 'top level'

/** A part in elevation; a return's extra width on the room side is not in it. */
export interface PartCorners {
  topA: Point
  topB: Point
  undersideA: Point
  undersideB: Point
}
export interface RailPart extends PieceDimensions {
  mark: string
  kind: PartKind
  slope: number
  endA: PartEnd
  endB: PartEnd
  /** What was added for a return or taken off for a volute. */
  note?: string
  /** Present where a plan cut follows an elevation miter. */
  turn?: string
  corners: PartCorners
}

export interface RailJoint extends MiterAnswer {
  /** Inches of weld once around. */
  perimeter: number
}

export interface RailReturn {
  end: 'bottom' | 'top'
  longPoint: number
  centre: number
  shortPoint: number
  /** Slope of the part it is cut from: the return is rolled with it. */
  rolledWithRake: number
  weld: number
  /** Which way it turns to the wall, going up. */
  turns: 'left' | 'right'
}

export interface SpacedBrackets {
  part: string
  spacing: number
  alongTopFromLowEnd: number[]
  alongUndersideFromLowEnd: number[]
}
export interface FieldBracket {
  /** Counted from 1, in the order given. */
  n: number
  part: string
  fromBottomNosingHorizontal: number
  alongTopFromLowEnd: number
  alongUndersideFromLowEnd: number
  tooCloseToJoint: boolean
}
export interface BracketOffRail {
  n: number
  off: true
}

export interface RailSticks {
  sticks: number
  bars: number[][]
  drops: number[]
  yieldPct: number
  /** No fewer sticks can do than this. */
  bound: number
  proved: boolean
  /** Marks of the parts and returns in each bar, in the order of `bars`. */
  marks: string[][]
  /** The same bars with the mitered pieces laid nose to tail. */
  nested: BarNest[]
}

export interface Closing {
  /** Counted from 1, bottom to top. */
  flight: number
  error: number
  verdict: ClosingVerdict
}

/** The stair under the rail as drawn, from low to high; each begins where the last one ended. */
export interface StairPiece {
  kind: 'floor' | 'flight' | 'landing' | 'upper floor'
  points: Point[]
  /** Treads are divided for the eye only: their number was not measured. */
  assumed: boolean
}

export interface RailWarning {
  field?: string
  message: string
}

/** `brackets`, `stock`, `weld` and `checks` are left out when they were not asked for. */
export interface HandrailOutputs {
  hand: 'L' | 'R'
  pitches: number[]
  /** Bottom to top. */
  parts: RailPart[]
  joints: RailJoint[]
  returns: RailReturn[]
  brackets?: SpacedBrackets[] | (FieldBracket | BracketOffRail)[]
  /** Null when a piece is longer than the stick; a warning names it. */
  stock?: RailSticks | null
  weld?: ConsumablesAnswer & { lengthIn: number }
  checks?: CodeRow[]
  knuckles: { fromTopNosing: number | null; fromBottomNosing: number | null }
  closing: Closing[]
  /** Top of the rail from its low end to its high end, knuckles between; volutes not taken off. */
  topLine: Point[]
  /** Nosings of each flight, bottom and top one at least. */
  nosings: Point[][]
  stair: StairPiece[]
  warnings: RailWarning[]
}
