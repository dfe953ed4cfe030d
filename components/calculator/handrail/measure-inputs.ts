import { readQuantity } from '@/lib/trade/quantity/read'
import type { RawInputs } from '../address'
import { textOfRaw } from '../field-kinds'
import { readList } from '../list-text'
import {
  blankMeasure,
  hasOneSize,
  type EndTexts,
  type Extra,
  type FlightTexts,
  type Measure,
  type Texts,
  type Way,
} from './measure'
import {
  allEndKeys,
  bracketKeys,
  endAsks,
  flightKeys,
  landingKeys,
  plainExtraKeys,
  plainExtras,
  returnKeys,
  sectionKeys,
} from './measure-keys'

const given = (texts: Readonly<Record<string, unknown>>, keys: readonly string[]) =>
  Object.fromEntries(keys.map((key) => [key, textOfRaw(texts[key])]).filter(([, text]) => text !== ''))

/** The first text tells the engine which way was chosen: left empty it is sent as a blank, which it asks for by name. */
const chosen = (texts: Texts, keys: readonly string[]) => ({
  ...given(texts, keys),
  ...(keys[0] !== undefined && (texts[keys[0]] ?? '') === '' ? { [keys[0]]: ' ' } : {}),
})

const isOn = ({ on }: Texts) => on === 'yes'

function endInputs(end: 'bottom' | 'top', texts: EndTexts) {
  return {
    ...given(texts, ['type', ...endAsks(end, texts.type)]),
    ...(isOn(texts.return) ? { return: given(texts.return, returnKeys) } : {}),
  }
}

function bracketInputs(brackets: Extra) {
  if (brackets.way !== 'field') return chosen(brackets, bracketKeys.spaced)
  return { ...given(brackets, ['jointClear']), field: readList(brackets.field ?? '') }
}

function sectionInputs(measure: Measure) {
  const texts: Texts = given(measure.section, sectionKeys)
  return hasOneSize(measure) && texts.depth ? { ...texts, width: texts.depth } : texts
}

/** What the engine is asked: of each flight the chosen way, of the extras those that are on. */
export function inputsOf(measure: Measure): RawInputs {
  const { hand, railHeight, flights, landings, bottom, top, brackets } = measure
  return {
    hand,
    railHeight,
    section: sectionInputs(measure),
    flights: flights.map((flight) => chosen(flight, flightKeys[flight.way])),
    landings: landings.map((landing) => given(landing, landingKeys)),
    bottom: endInputs('bottom', bottom),
    top: endInputs('top', top),
    ...(isOn(brackets) ? { brackets: bracketInputs(brackets) } : {}),
    ...Object.fromEntries(
      plainExtras
        .filter((name) => isOn(measure[name]))
        .map((name) => [name, given(measure[name], plainExtraKeys[name])]),
    ),
  }
}

type Named = Readonly<Record<string, unknown>>
const named = (value: unknown): Named => (typeof value === 'object' && value !== null ? (value as Named) : {})
const items = (value: unknown): readonly unknown[] => (Array.isArray(value) ? (value as unknown[]) : [])

function wayOf(flight: Named): Way {
  const ways: readonly Way[] = ['count', 'rake', 'tape']
  return ways.find((way) => textOfRaw(flight[flightKeys[way][0] ?? '']) !== '') ?? 'tape'
}

function endTexts(end: 'bottom' | 'top', value: unknown): EndTexts {
  const texts = named(value)
  const returned = texts.return === undefined || texts.return === null ? '' : 'yes'
  return {
    ...given(texts, allEndKeys[end]),
    type: textOfRaw(texts.type) || 'none',
    return: { on: returned, ...given(named(texts.return), returnKeys) },
  }
}

function sameSize(one = '', other = ''): boolean {
  const [a, b] = [readQuantity(one, 'in'), readQuantity(other, 'in')]
  return one === other || ('value' in a && 'value' in b && a.value === b.value)
}

/** A round or square section of two sizes is neither: both sizes stay in sight as those of a rectangle. */
function sectionTexts(value: unknown): Texts {
  const { width, ...texts }: Texts = given(named(value), sectionKeys)
  if (texts.shape === 'rect') return { ...texts, ...(width ? { width } : {}) }
  return width === undefined || sameSize(texts.depth, width) ? texts : { ...texts, width, shape: 'rect' }
}

function bracketTexts(value: unknown): Extra {
  if (value === undefined || value === null) return blankMeasure.brackets
  const texts = named(value)
  const field = items(texts.field).map(textOfRaw).join('; ')
  const way = texts.field === undefined ? 'spaced' : 'field'
  return { on: 'yes', way, ...given(texts, ['endDistance', 'maxSpacing', 'jointClear']), ...(field ? { field } : {}) }
}

/** A field sheet filled from inputs as an entry, a link or a saved cut sheet holds them: text or numbers. */
export function measureFromInputs(inputs: RawInputs): Measure {
  const flights = items(inputs.flights).map((flight): FlightTexts => {
    const way = wayOf(named(flight))
    return { ...given(named(flight), flightKeys[way]), way }
  })
  const whole = flights.length > 0 ? flights : blankMeasure.flights
  const landings = items(inputs.landings).map((landing) => given(named(landing), landingKeys))
  const extras = plainExtras.map((name) => {
    const off = inputs[name] === undefined || inputs[name] === null
    return [name, { on: off ? '' : 'yes', ...given(named(inputs[name]), plainExtraKeys[name]) }] as const
  })
  return {
    ...blankMeasure,
    hand: textOfRaw(inputs.hand) || blankMeasure.hand,
    railHeight: textOfRaw(inputs.railHeight),
    section: { ...blankMeasure.section, ...sectionTexts(inputs.section) },
    flights: whole,
    landings: whole.slice(1).map((_, i) => landings[i] ?? {}),
    bottom: endTexts('bottom', inputs.bottom),
    top: endTexts('top', inputs.top),
    brackets: bracketTexts(inputs.brackets),
    ...Object.fromEntries(extras),
  }
}
