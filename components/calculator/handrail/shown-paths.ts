import { hasOneSize, type Measure } from './measure'
import { bracketKeys, endAsks, flightKeys, landingKeys, plainExtraKeys, plainExtras, returnKeys } from './measure-keys'

function endPaths(measure: Measure, end: 'bottom' | 'top'): string[] {
  const texts = measure[end]
  return [
    ...endAsks(end, texts.type).map((key) => `${end}.${key}`),
    ...(texts.return.on === 'yes' ? returnKeys.map((key) => `${end}.return.${key}`) : []),
  ]
}

/** Paths of every number that stands on the sheet, in its order. */
export function shownPaths(measure: Measure): string[] {
  const { flights, brackets } = measure
  const spaced = brackets.on === 'yes' && brackets.way !== 'field'
  return [
    'railHeight',
    'section.depth',
    ...(hasOneSize(measure) ? [] : ['section.width']),
    ...endPaths(measure, 'bottom'),
    ...flights.flatMap((flight, i) => [
      ...(i > 0 ? landingKeys.map((key) => `landings[${i - 1}].${key}`) : []),
      ...flightKeys[flight.way].map((key) => `flights[${i}].${key}`),
    ]),
    ...endPaths(measure, 'top'),
    ...(spaced ? bracketKeys.spaced.map((key) => `brackets.${key}`) : []),
    ...(brackets.on === 'yes' && !spaced ? ['brackets.jointClear'] : []),
    ...plainExtras
      .filter((name) => measure[name].on === 'yes')
      .flatMap((name) => plainExtraKeys[name].map((key) => `${name}.${key}`)),
  ]
}
