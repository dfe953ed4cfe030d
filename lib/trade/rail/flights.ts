import { atanDeg, cosDeg, sinDeg, tanDeg } from '../angles'
import { between, notNegative, positive } from '../checks'
import { nosingLine } from '../nosing-line'
import { firstRefusal, isRefusal, refuse, type Refusal } from '../refusal'
import type { Flight, FlightByCount, FlightByRake, FlightByTape } from './types'

/** A flight however it was measured: bottom nosing to top nosing. */
export interface MeasuredFlight {
  run: number
  rise: number
  pitch: number
  firstRise: number | null
  /** Every riser known on its own, for the code rows. */
  rises: number[]
  /** One tread, for the code rows and the drawing. */
  unitRun: number | null
  /** Steps of rake, where they were counted. */
  steps: number | null
  /** The measure to look at when the flight turns out too short. */
  field: string
}

function byCount(flight: FlightByCount, at: string): MeasuredFlight | Refusal {
  const line = nosingLine(flight)
  if (isRefusal(line)) return refuse(`${at}.${line.field}`, line.message)
  return {
    run: line.runNosingToNosing,
    rise: line.riseNosingToNosing,
    pitch: line.pitch,
    firstRise: flight.rise,
    rises: [flight.rise],
    unitRun: flight.run,
    steps: flight.risers - 1,
    field: `${at}.risers`,
  }
}

/** Optional taped figures of a flight that was not counted. */
function extrasFault({ firstRise, run }: Pick<FlightByTape, 'firstRise' | 'run'>, at: string): Refusal | null {
  return firstRefusal([
    typeof firstRise === 'number' ? notNegative(`${at}.firstRise`, firstRise, 'The first rise') : null,
    typeof run === 'number' ? positive(`${at}.run`, run, 'The run') : null,
  ])
}

/** The unit rise follows from pitch and run; the first riser, where taped, is a riser too. */
function uncounted(
  flight: Pick<FlightByTape, 'firstRise' | 'run'>,
  rise: number,
  run: number,
  pitch: number,
  field: string,
): MeasuredFlight {
  const firstRise = flight.firstRise ?? null
  const unitRun = flight.run ?? null
  const rises = [...(unitRun === null ? [] : [unitRun * tanDeg(pitch)]), ...(firstRise ? [firstRise] : [])]
  return { run, rise, pitch, firstRise, rises, unitRun, steps: null, field }
}

function byRake(flight: FlightByRake, at: string): MeasuredFlight | Refusal {
  const { rake, pitch } = flight
  const fault = firstRefusal([
    positive(`${at}.rake`, rake, 'The rake'),
    between(`${at}.pitch`, pitch, 0, 90, 'The pitch'),
    extrasFault(flight, at),
  ])
  return fault ?? uncounted(flight, rake * sinDeg(pitch), rake * cosDeg(pitch), pitch, `${at}.rake`)
}

function byTape(flight: FlightByTape, at: string): MeasuredFlight | Refusal {
  const { nosingRise, nosingRun, nosingRake } = flight
  const fault = firstRefusal([
    positive(`${at}.nosingRise`, nosingRise, 'The rise from nosing to nosing'),
    positive(`${at}.nosingRun`, nosingRun, 'The run from nosing to nosing'),
    typeof nosingRake === 'number' ? positive(`${at}.nosingRake`, nosingRake, 'The rake from nosing to nosing') : null,
    extrasFault(flight, at),
  ])
  return fault ?? uncounted(flight, nosingRise, nosingRun, atanDeg(nosingRise, nosingRun), `${at}.nosingRun`)
}

/** Reads one flight in whichever form it was measured; `index` counts from 0, bottom to top. */
export function measureFlight(flight: Flight, index: number): MeasuredFlight | Refusal {
  const at = `flights[${index}]`
  if ('risers' in flight) return byCount(flight, at)
  return 'rake' in flight ? byRake(flight, at) : byTape(flight, at)
}
