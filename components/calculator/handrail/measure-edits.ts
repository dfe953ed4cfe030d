import { hasOneSize, noFlight, textAt, withText, type ExtraName, type Measure } from './measure'

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

/** What the code rows ask and the sheet knows already: nothing is written twice. */
const knownAlready: Readonly<Record<string, (measure: Measure) => string | undefined>> = {
  'code.outsideDia': (measure) => (hasOneSize(measure) ? measure.section.depth : undefined),
  'code.wallClearance': ({ top, bottom }) => top.return.clearance ?? bottom.return.clearance,
}

/** An extra asked for, or no longer; what it held stays. */
export function turnExtra(measure: Measure, name: ExtraName): Measure {
  const on = measure[name].on === 'yes'
  const turned = withText(measure, `${name}.on`, on ? '' : 'yes')
  if (on || name !== 'code') return turned
  return Object.entries(knownAlready).reduce(
    (now, [path, known]) => (textAt(now, path) === '' ? withText(now, path, known(now) ?? '') : now),
    turned,
  )
}
