import type { Box, Point } from './boxes'
import type { Fill, Ink, LabelInk, Shape } from './kinds'

/** One line or outline on paper: px, y down. */
export interface Mark {
  points: readonly Point[]
  closed: boolean
  ink: Ink
  fill?: Fill
  /** Px. */
  width: number
  part?: string
  passable?: boolean
}

/** A piece of a label, at its place inside it: px from the label's own left end and first baseline, y down. */
export type PlacedRun = { x: number; y: number; size: number; width: number; ink: LabelInk } & (
  { kind: 'text'; face: 'mono' | 'word'; text: string } | { kind: 'shape'; shape: Shape }
)

export interface PlacedLabel {
  runs: readonly PlacedRun[]
  /** Where the runs start, and how far they are turned about it, degrees clockwise as SVG turns. */
  x: number
  y: number
  turn: number
  /** What the label covers. */
  box: Box
  badge?: 'disc'
  part?: string
}

/** A composed drawing, ready for a screen or a sheet. */
export interface Plate {
  width: number
  height: number
  /** Px an inch of the model. */
  scale: number
  /** Where the model's origin lies on the paper. */
  origin: Point
  marks: readonly Mark[]
  labels: readonly PlacedLabel[]
  /** How many optional labels found no room. */
  dropped: number
  says: string
}
