import { blankMeasure, type EndTexts, type FlightTexts, type Measure, type Texts, type Way } from './measure'
import {
  allEndKeys,
  bracketKeys,
  flightKeys,
  landingKeys,
  plainExtraKeys,
  plainExtras,
  returnKeys,
  sectionKeys,
} from './measure-keys'

/**
 * A measure as one parameter that a hand can still read: blocks parted by `!`, each a letter and its texts parted by
 * `~`, as in `r~L~36!s~round~1.66~1.66!t~35~55`. Neither sign is part of any measure.
 */
export const measureParameter = 'm'

const wayLetters: Readonly<Record<Way, string>> = { count: 'n', rake: 'k', tape: 't' }
const extraLetters = { stock: 'x', weld: 'w', code: 'c', volutes: 'v' } as const
const endLetters = { bottom: 'b', top: 'u' } as const
const ends = ['bottom', 'top'] as const
const mostFlights = 12

const block = (letter: string, texts: readonly (string | undefined)[]) =>
  [letter, ...texts.map((text) => (text ?? '').replace(/[~!]/g, ''))].join('~').replace(/~+$/, '')
const textsOf = (texts: Readonly<Record<string, unknown>>, keys: readonly string[]) =>
  keys.map((key) => (typeof texts[key] === 'string' ? texts[key] : ''))

function endBlock(end: 'bottom' | 'top', texts: EndTexts): string {
  return block(endLetters[end], [...textsOf(texts, allEndKeys[end]), ...textsOf(texts.return, ['on', ...returnKeys])])
}

/** The text of a measure, for an address or to keep. */
export function writeMeasure(measure: Measure): string {
  const { hand, railHeight, section, flights, landings, brackets } = measure
  const spaced = brackets.way !== 'field'
  return [
    block('r', [hand, railHeight]),
    block('s', textsOf(section, sectionKeys)),
    endBlock('bottom', measure.bottom),
    ...flights.flatMap((flight, i) => [
      block(wayLetters[flight.way], textsOf(flight, flightKeys[flight.way])),
      ...(landings[i] && i < flights.length - 1 ? [block('l', textsOf(landings[i], landingKeys))] : []),
    ]),
    endBlock('top', measure.top),
    ...(brackets.on ? [block(spaced ? 'p' : 'f', textsOf(brackets, bracketKeys[spaced ? 'spaced' : 'field']))] : []),
    ...plainExtras
      .filter((name) => measure[name].on)
      .map((name) => block(extraLetters[name], textsOf(measure[name], plainExtraKeys[name]))),
  ].join('!')
}

/** The parameter as an address holds it: spaces as `+`, and fractions left to be read. */
export const measureQuery = (measure: Measure): string =>
  `?${measureParameter}=${encodeURIComponent(writeMeasure(measure)).replace(/%20/g, '+').replace(/%2F/g, '/')}`

const pick = (keys: readonly string[], texts: readonly string[]): Texts =>
  Object.fromEntries(keys.map((key, i) => [key, texts[i] ?? '']).filter(([, text]) => text !== ''))

/** Reads what writeMeasure wrote; null where there is no flight in it. What is not known is passed over. */
export function readMeasure(text: string | null | undefined): Measure | null {
  if (!text) return null
  const blocks = text.split('!').map((part) => {
    const [letter = '', ...texts] = part.split('~')
    return { letter, texts }
  })
  const of = (letter: string) => blocks.find((found) => found.letter === letter)?.texts
  const ways = Object.entries(wayLetters) as [Way, string][]
  const flights = blocks.flatMap(({ letter, texts }): FlightTexts[] => {
    const way = ways.find(([, sign]) => sign === letter)?.[0]
    return way ? [{ ...pick(flightKeys[way], texts), way }] : []
  })
  if (flights.length === 0) return null
  const landings = blocks.filter(({ letter }) => letter === 'l').map(({ texts }) => pick(landingKeys, texts))
  const [hand = '', railHeight = ''] = of('r') ?? []
  return {
    ...blankMeasure,
    hand: hand === 'R' ? 'R' : 'L',
    railHeight,
    section: { ...blankMeasure.section, ...pick(sectionKeys, of('s') ?? []) },
    flights: flights.slice(0, mostFlights),
    landings: flights.slice(1, mostFlights).map((_, i) => landings[i] ?? {}),
    ...Object.fromEntries(ends.map((end) => [end, readEnd(end, of(endLetters[end]) ?? [])])),
    ...readExtras(of),
  }
}

function readEnd(end: 'bottom' | 'top', texts: readonly string[]): EndTexts {
  const keys = allEndKeys[end]
  const own = pick(keys, texts)
  return {
    ...own,
    type: own.type ?? 'none',
    return: { on: '', ...pick(['on', ...returnKeys], texts.slice(keys.length)) },
  }
}

function readExtras(of: (letter: string) => readonly string[] | undefined): Partial<Measure> {
  const spaced = of('p')
  const field = of('f')
  const brackets = spaced
    ? { on: 'yes', way: 'spaced', ...pick(bracketKeys.spaced, spaced) }
    : field
      ? { on: 'yes', way: 'field', ...pick(bracketKeys.field, field) }
      : blankMeasure.brackets
  const plain = plainExtras.flatMap((name) => {
    const texts = of(extraLetters[name])
    return texts ? [[name, { on: 'yes', ...pick(plainExtraKeys[name], texts) }] as const] : []
  })
  return { brackets, ...Object.fromEntries(plain) }
}
