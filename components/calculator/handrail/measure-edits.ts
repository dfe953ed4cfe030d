import { noFlight, type Measure } from './measure'

/** As many as the entry works at once. */
export const mostFlights = 12

/** One more flight at the top, with the landing that leads to it, measured the way the last one was. */
export function addFlight(measure: Measure): Measure {
  const way = measure.flights.at(-1)?.way ?? noFlight.way
  return {
    ...measure,
    flights: [...measure.flights, { way }],
    landings: [...measure.landings, {}],
  }
}

/** Without one flight and the landing below it; the lowest flight takes the landing above it along. */
export function removeFlight(measure: Measure, index: number): Measure {
  const landing = Math.max(0, index - 1)
  return {
    ...measure,
    flights: measure.flights.filter((_, i) => i !== index),
    landings: measure.landings.filter((_, i) => i !== landing),
  }
}

/** The same rail on the other side of the stair: not one length changes. */
export const mirrorHand = (measure: Measure): Measure => ({ ...measure, hand: measure.hand === 'L' ? 'R' : 'L' })
