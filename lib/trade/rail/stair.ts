import type { PlacedFlight } from './top-line'
import type { HandrailInputs, Point, StairPiece } from './types'

/** Tread and drop drawn where nobody measured one, in inches. */
const drawnTread = 11
const drawnRise = 7

/** Steps of rake: counted, or divided for the eye by the tread. */
function stepsOf({ steps, run, unitRun }: PlacedFlight): number {
  return steps ?? Math.max(1, Math.round(run / (unitRun ?? drawnTread)))
}

/** Nosings of a flight from its bottom one to its top one. */
export function nosingsOf(flight: PlacedFlight): Point[] {
  const steps = stepsOf(flight)
  const { bottomNosing, run, rise } = flight
  return Array.from({ length: steps + 1 }, (_, i) => ({
    x: bottomNosing.x + (run * i) / steps,
    y: bottomNosing.y + (rise * i) / steps,
  }))
}

/** Tread, riser, tread, riser: from one nosing to the next. */
function treads(nosings: readonly Point[]): Point[] {
  return nosings.flatMap((nosing, i) => {
    const below = nosings[i - 1]
    return below ? [{ x: nosing.x, y: below.y }, nosing] : [nosing]
  })
}

/** The stair as drawn under the rail: floor, flights, landings, upper floor; `reach` beyond either end. */
export function stairUnder(
  { landings, top }: HandrailInputs,
  flights: readonly PlacedFlight[],
  lowX: number,
  highX: number,
): StairPiece[] {
  const first = flights[0]
  const last = flights.at(-1)
  if (!first || !last) return []
  const drop = first.firstRise ?? first.rises[0] ?? drawnRise
  const floor: Point[] = [
    { x: Math.min(lowX, 0) - drawnTread, y: -drop },
    { x: 0, y: -drop },
    { x: 0, y: 0 },
  ]
  const pieces: StairPiece[] = [{ kind: 'floor', points: floor, assumed: first.firstRise === null }]
  for (const [i, flight] of flights.entries()) {
    pieces.push({ kind: 'flight', points: treads(nosingsOf(flight)), assumed: flight.steps === null })
    const above = flights[i + 1]
    const landing = landings?.[i]
    if (!above || !landing) continue
    const foot = { x: above.bottomNosing.x, y: above.bottomNosing.y - (above.firstRise ?? 0) }
    pieces.push({ kind: 'landing', points: [flight.topNosing, foot, above.bottomNosing], assumed: false })
  }
  return [...pieces, upperFloor(last.topNosing, top.slopeInPerFt ?? 0, highX)]
}

function upperFloor(from: Point, slopeInPerFt: number, highX: number): StairPiece {
  const reach = Math.max(highX - from.x, 0) + drawnTread
  return {
    kind: 'upper floor',
    points: [from, { x: from.x + reach, y: from.y + (reach * slopeInPerFt) / 12 }],
    assumed: false,
  }
}
