import { cosDeg, slopeDeg } from '../angles'
import { isRefusal, refuse, type Refusal } from '../refusal'
import { measureFlight, type MeasuredFlight } from './flights'
import { meet, pointOn, type Line } from './lines'
import type { HandrailInputs, PartKind, Point } from './types'

/** One straight run of the top line between two knuckles or ends. */
export interface Run {
  kind: PartKind
  line: Line
  /** The measure to look at when the run turns out too short. */
  field: string
  /** Where it would join the next run if both were one straight line. */
  joinX: number
}

export interface PlacedFlight extends MeasuredFlight {
  bottomNosing: Point
  topNosing: Point
}

export interface TopLine {
  runs: Run[]
  flights: PlacedFlight[]
  /** Low end, knuckles, high end: one point more than runs. */
  points: Point[]
}

type Place = { flights: PlacedFlight[]; runs: Run[] }

const landingSlope = (inPerFt: number | null | undefined) => slopeDeg(inPerFt ?? 0)

/** Stands the first nosing of flight `index` one rise above the far end of the landing below it. */
function firstNosing(
  field: HandrailInputs,
  index: number,
  below: PlacedFlight | undefined,
  flight: MeasuredFlight,
): Point | Refusal {
  const landing = field.landings?.[index - 1]
  if (!below || !landing) return { x: 0, y: 0 }
  if (flight.firstRise === null) {
    return refuse(
      `flights[${index}].firstRise`,
      'A flight above a landing needs its first rise, landing to first nosing.',
    )
  }
  const climbed = (landing.length * (landing.slopeInPerFt ?? 0)) / 12
  return { x: below.topNosing.x + landing.length, y: below.topNosing.y + climbed + flight.firstRise }
}

function landingRun(field: HandrailInputs, index: number, below: PlacedFlight, joinX: number): Run {
  const landing = field.landings?.[index]
  const { x, y } = below.topNosing
  const line = { x, y: y + (landing?.railHeight ?? field.railHeight), slope: landingSlope(landing?.slopeInPerFt) }
  return { kind: 'landing', line, field: `landings[${index}].length`, joinX }
}

/** Places every flight, with the landings between them. */
function placeFlights(field: HandrailInputs): Place | Refusal {
  const placed: Place = { flights: [], runs: [] }
  for (const [index, given] of field.flights.entries()) {
    const flight = measureFlight(given, index)
    if (isRefusal(flight)) return flight
    const below = placed.flights.at(-1)
    const foot = firstNosing(field, index, below, flight)
    if (isRefusal(foot)) return foot
    const topNosing = { x: foot.x + flight.run, y: foot.y + flight.rise }
    if (below) placed.runs.push(landingRun(field, index - 1, below, foot.x))
    const line = { x: foot.x, y: foot.y + field.railHeight, slope: flight.pitch }
    placed.runs.push({ kind: 'rake', line, field: flight.field, joinX: topNosing.x })
    placed.flights.push({ ...flight, bottomNosing: foot, topNosing })
  }
  return placed
}

function bottomLevelRun({ bottom, railHeight }: HandrailInputs, first: PlacedFlight): Run | Refusal {
  if (first.firstRise === null) {
    return refuse('flights[0].firstRise', 'A level bottom end needs the first rise, floor to first nosing.')
  }
  const y = (bottom.railHeight ?? railHeight) - first.firstRise
  return { kind: 'bottom level', line: { x: 0, y, slope: 0 }, field: 'bottom.length', joinX: 0 }
}

function topLevelRun({ top, railHeight }: HandrailInputs, { topNosing }: PlacedFlight): Run {
  const line = {
    x: topNosing.x,
    y: topNosing.y + (top.railHeight ?? railHeight),
    slope: landingSlope(top.slopeInPerFt),
  }
  return { kind: 'top level', line, field: 'top.length', joinX: topNosing.x }
}

/** Knuckles between neighbouring runs, or the measure that keeps two of them from meeting. */
function findKnuckles(runs: Run[]): Point[] | Refusal {
  const knuckles: Point[] = []
  for (const [i, upper] of runs.entries()) {
    const lower = runs[i - 1]
    if (!lower) continue
    const knuckle = meet(lower.line, upper.line, lower.joinX)
    if (!knuckle) return refuse(upper.field, 'These two runs are parallel and never meet: check slopes and heights.')
    knuckles.push(knuckle)
  }
  return knuckles
}

function lowEnd({ bottom }: HandrailInputs, first: Run, knuckle: Point | undefined): Point {
  if (bottom.type === 'level' && knuckle) return pointOn(first.line, knuckle.x - (bottom.length ?? 0))
  return pointOn(first.line, bottom.type === 'slope' ? -(bottom.horizontal ?? 0) : 0)
}

/** The nosing line copied plumb at rail height, with its level runs: every run, nosing and knuckle of the rail. */
export function layTopLine(field: HandrailInputs): TopLine | Refusal {
  const placed = placeFlights(field)
  if (isRefusal(placed)) return placed
  const { flights, runs } = placed
  const first = flights[0]
  const last = flights.at(-1)
  if (!first || !last) return refuse('flights', 'Give at least one flight.')
  const bottom = field.bottom.type === 'level' ? bottomLevelRun(field, first) : null
  if (isRefusal(bottom)) return bottom
  const all = [...(bottom ? [bottom] : []), ...runs, ...(field.top.type === 'level' ? [topLevelRun(field, last)] : [])]
  const knuckles = findKnuckles(all)
  if (isRefusal(knuckles)) return knuckles
  const points = closeEnds(field, all, knuckles, last)
  return { runs: all, flights, points }
}

function closeEnds(field: HandrailInputs, runs: Run[], knuckles: Point[], last: PlacedFlight): Point[] {
  const [lowest, highest] = [runs[0], runs.at(-1)]
  if (!lowest || !highest) return knuckles
  const highX = last.topNosing.x + (field.top.type === 'level' ? (field.top.length ?? 0) : 0)
  return [lowEnd(field, lowest, knuckles[0]), ...knuckles, pointOn(highest.line, highX)]
}

/** Length of run `i` along the rail; negative where its knuckles stand the wrong way round. */
export function runLength({ points, runs }: TopLine, i: number): number {
  const [low, high, run] = [points[i], points[i + 1], runs[i]]
  return low && high && run ? (high.x - low.x) / cosDeg(run.line.slope) : 0
}
