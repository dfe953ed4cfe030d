import type { Fill, Ink, LabelSize, Show } from './kinds'
import type { RichText } from './text'

export type { Fill, Ink, LabelInk, Show } from './kinds'

/** A place in the model, inches with y up, moved by so much on paper (px, y up) whatever the scale. */
export interface Spot {
  x: number
  y: number
  dx?: number
  dy?: number
}

interface Belongs {
  /** The part it belongs to: pointing at that part anywhere lights it here. */
  part?: string
  /** Lines that labels may touch: the grain of a surface, or an edge that a label is meant to sit on. */
  passable?: boolean
}
export interface PathStroke extends Belongs {
  kind: 'path'
  points: readonly Spot[]
  closed?: boolean
  ink: Ink
  fill?: Fill
}
export interface ArcStroke extends Belongs {
  kind: 'arc'
  centre: Spot
  /** Inches in the model, or px on paper. */
  radius: { inches: number } | { paper: number }
  /** Degrees from level, counterclockwise. */
  from: number
  to: number
  ink: Ink
}
export type Stroke = PathStroke | ArcStroke

interface Asked {
  required: boolean
  /** How much scale an optional label is worth, in hundredths of the largest. */
  worth?: number
  /** What to say instead where this finds no room. */
  otherwise?: LabelRequest
  part?: string
}
interface Words extends Asked {
  text: RichText
  size: LabelSize
}
/** Beside a spot: directions in degrees from level, best first; further off it hangs on a leader. */
export interface LabelAt extends Words {
  kind: 'at'
  spot: Spot
  prefer: readonly number[]
  /** Px from the spot to the nearest edge of the label. */
  gap?: number
  /** How far it may drift before it is dropped, px. */
  reach?: number
  badge?: 'disc'
  leader?: boolean
}
/** Turned to a line, never upside down. */
export interface LabelAlong extends Words {
  kind: 'along'
  from: Spot
  to: Spot
  side: 'above' | 'below' | 'within'
  gap?: number
  reach?: number
  badge?: 'disc'
}
/** A dimension: ticked line off the object, extension lines, its words along it. */
export interface Dimension extends Words {
  kind: 'dimension'
  from: Spot
  to: Spot
  /** Which side of the way from → to it stands off. */
  side: 'left' | 'right'
  /** Measured along the points, or level or plumb between them. */
  measure?: 'aligned' | 'level' | 'plumb'
  /** Px of the first try off the object, and of each further one. */
  offset?: number
  step?: number
  tries?: number
  ink?: Ink
}
export type LabelRequest = LabelAt | LabelAlong | Dimension

/** Geometry and wishes of one drawing, before it knows its paper. */
export interface Sketch {
  strokes: readonly Stroke[]
  labels: readonly LabelRequest[]
  /** The drawing in words, with its numbers. */
  says: string
}

/** A pure function of what was given and what was solved. */
export type Drawing<Given = Record<string, unknown>, Solved = Record<string, unknown>> = (
  given: Given,
  solved: Solved,
  show: Show,
) => Sketch
