/** What a field measure of one rail says. Lengths in inches, angles in degrees. */

/** What is optional may be left out or null. */
type Optional<T> = T | null | undefined

export interface Section {
  shape: 'round' | 'square' | 'rect'
  /** Seen from the side. */
  depth: number
  width: number
}

export interface FlightByCount {
  risers: number
  rise: number
  run: number
}
export interface FlightByRake {
  /** Bottom nosing to top nosing. */
  rake: number
  pitch: number
  firstRise?: Optional<number>
  /** For the code rows only. */
  run?: Optional<number>
}
export interface FlightByTape {
  nosingRise: number
  nosingRun: number
  /** For the closing check only. */
  nosingRake?: Optional<number>
  firstRise?: Optional<number>
  run?: Optional<number>
}
export type Flight = FlightByCount | FlightByRake | FlightByTape

export interface Landing {
  /** Top nosing of the flight below to the first nosing of the flight above, level. */
  length: number
  /** + rises away; 0 when left out. */
  slopeInPerFt?: Optional<number>
  /** The rail height of the stair when left out. */
  railHeight?: Optional<number>
}

export interface ReturnGiven {
  clearance: number
  /** 0 when left out. */
  gap?: Optional<number>
}
export interface BottomEnd {
  type: 'none' | 'slope' | 'level'
  /** A sloped end's reach in front of the bottom nosing. */
  horizontal?: Optional<number>
  /** A level end's length outward from its knuckle. */
  length?: Optional<number>
  railHeight?: Optional<number>
  return?: Optional<ReturnGiven>
}
export interface TopEnd {
  type: 'none' | 'level'
  /** Past the top nosing. */
  length?: Optional<number>
  slopeInPerFt?: Optional<number>
  railHeight?: Optional<number>
  return?: Optional<ReturnGiven>
}

export interface SpacedBracketsGiven {
  endDistance: number
  maxSpacing: number
}
export interface FieldBracketsGiven {
  /** Horizontal from the bottom nosing, + uphill. */
  field: number[]
  /** 3 when left out. */
  jointClear?: Optional<number>
}
export interface StockGiven {
  length: number
  kerf: number
  /** 0 when left out. */
  trim?: Optional<number>
}
export interface WeldGiven {
  areaIn2: number
  efficiency: number
  lbPerHour: number
  /** 25 when left out. */
  arcOnPct?: Optional<number>
}
export interface CodeGiven {
  outsideDia: number
  wallClearance: number
}

export interface HandrailInputs {
  hand: 'L' | 'R'
  section: Section
  /** Plumb, nosing to top of rail. */
  railHeight: number
  /** Bottom to top. */
  flights: Flight[]
  /** One fewer than flights. */
  landings?: Optional<Landing[]>
  bottom: BottomEnd
  top: TopEnd
  volutes?: Optional<{ bottom?: Optional<number>; top?: Optional<number> }>
  brackets?: Optional<SpacedBracketsGiven | FieldBracketsGiven>
  stock?: Optional<StockGiven>
  weld?: Optional<WeldGiven>
  code?: Optional<CodeGiven>
}
