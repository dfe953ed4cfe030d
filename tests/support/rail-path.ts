import type { Flight, HandrailInputs } from '@/lib/trade/rail/types'
import { crossing, type Segment, type Spot } from './offset-geometry'

const radians = Math.PI / 180

/** Run, rise and first rise of a flight, straight from its measure. */
function extent(flight: Flight): { across: number; up: number; first: number } {
  if ('risers' in flight) {
    return { across: (flight.risers - 1) * flight.run, up: (flight.risers - 1) * flight.rise, first: flight.rise }
  }
  const first = flight.firstRise ?? 0
  if ('rake' in flight) {
    return {
      across: flight.rake * Math.cos(flight.pitch * radians),
      up: flight.rake * Math.sin(flight.pitch * radians),
      first,
    }
  }
  return { across: flight.nosingRun, up: flight.nosingRise, first }
}

const lifted = ({ x, y }: Spot, height: number): Spot => ({ x, y: y + height })

/** The rail's runs as segments over the stair, each between the nosings it belongs to; not yet joined. */
function runsOf(field: HandrailInputs): { runs: Segment[]; topNosing: Spot } {
  const { railHeight, bottom, top } = field
  const runs: Segment[] = []
  let foot: Spot = { x: 0, y: 0 }
  let head = foot
  for (const [i, flight] of field.flights.entries()) {
    const { across, up, first } = extent(flight)
    if (i === 0 && bottom.type === 'level') {
      const y = (bottom.railHeight ?? railHeight) - first
      runs.push([
        { x: -100, y },
        { x: 0, y },
      ])
    }
    const landing = field.landings?.[i - 1]
    if (landing) {
      const edge = { x: head.x + landing.length, y: head.y + (landing.length / 12) * (landing.slopeInPerFt ?? 0) }
      const height = landing.railHeight ?? railHeight
      runs.push([lifted(head, height), lifted(edge, height)])
      foot = lifted(edge, first)
    }
    head = { x: foot.x + across, y: foot.y + up }
    runs.push([lifted(foot, railHeight), lifted(head, railHeight)])
  }
  if (top.type === 'level') {
    const height = top.railHeight ?? railHeight
    runs.push([lifted(head, height), lifted({ x: head.x + 12, y: head.y + (top.slopeInPerFt ?? 0) }, height)])
  }
  return { runs, topNosing: head }
}

const plumbAt = (x: number): Segment => [
  { x, y: 0 },
  { x, y: 1 },
]

/** Top of the rail from end to end, built from the field measure alone by crossing lines. */
export function railPath(field: HandrailInputs): Spot[] {
  const { runs, topNosing } = runsOf(field)
  const knuckles = runs.slice(1).map((run, i) => crossing(runs[i] ?? run, run))
  const { bottom, top } = field
  const lowX = bottom.type === 'level' ? (knuckles[0]?.x ?? 0) - (bottom.length ?? 0) : -(bottom.horizontal ?? 0)
  const highX = topNosing.x + (top.type === 'level' ? (top.length ?? 0) : 0)
  const [first, last] = [runs[0], runs.at(-1)]
  if (!first || !last) throw new Error('A rail has at least one run')
  return [crossing(first, plumbAt(lowX)), ...knuckles, crossing(last, plumbAt(highX))]
}
