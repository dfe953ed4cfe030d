import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { readMeasure, writeMeasure } from '@/components/calculator/handrail/measure-address'
import { addFlight, mirrorHand, removeFlight } from '@/components/calculator/handrail/measure-edits'
import { inputsOf, measureFromInputs } from '@/components/calculator/handrail/measure-inputs'
import {
  endAsks,
  flightKeys,
  landingKeys,
  plainExtraKeys,
  returnKeys,
} from '@/components/calculator/handrail/measure-keys'
import {
  blankMeasure,
  textAt,
  withText,
  type Measure,
  type Texts,
  type Way,
} from '@/components/calculator/handrail/measure'
import { placedFaults } from '@/components/calculator/handrail/placed-faults'
import { shownPaths } from '@/components/calculator/handrail/shown-paths'
import { answer } from '@/lib/calculators/answer'
import { asAny } from '@/lib/calculators/define'
import { handrail } from '@/lib/calculators/field/handrail'
import { defaultPrecision } from '@/lib/calculators/fields'

/** What a hand may write in a box, readable or not; the two signs that part an address are dropped on the way. */
const written = fc.oneof(
  fc.constantFrom('36', `6' 2 1/2"`, '6-1/2', '1892 mm', '-1/8', '5,5', 'abc', 'ÄÖ ½', 'a=1&m=2', '100%', '+ 7', '#'),
  fc.string({ unit: 'grapheme', minLength: 1, maxLength: 12 }).map((text) => text.replace(/[~!]/g, '').trim()),
)
const texts = (keys: readonly string[]) =>
  fc
    .dictionary(fc.constantFrom(...keys), written)
    .map((found): Texts => Object.fromEntries(Object.entries(found).filter(([, text]) => text !== '')))
const extra = (keys: readonly string[]) => texts(keys).map((found) => ({ ...found, on: 'yes' }))
const flight = fc
  .constantFrom<Way>('tape', 'rake', 'count')
  .chain((way) => texts(flightKeys[way]).map((found) => ({ ...found, way })))
const end = (side: 'bottom' | 'top', types: readonly string[]) =>
  fc.constantFrom(...types).chain((type) => {
    const asked = endAsks(side, type)
    return fc
      .record({ own: asked.length > 0 ? texts(asked) : fc.constant({}), returned: extra(returnKeys) })
      .map(({ own, returned }) => ({ ...own, type, return: returned }))
  })

const measures: fc.Arbitrary<Measure> = fc.array(flight, { minLength: 1, maxLength: 5 }).chain((flights) =>
  fc.record({
    hand: fc.constantFrom('L', 'R'),
    railHeight: written,
    section: texts(['depth', 'width']).map((found) => ({ ...found, shape: 'rect' })),
    flights: fc.constant(flights),
    landings: fc.tuple(...flights.slice(1).map(() => texts(landingKeys))),
    bottom: end('bottom', ['none', 'slope', 'level']),
    top: end('top', ['none', 'level']),
    brackets: texts(['endDistance', 'maxSpacing']).map((found) => ({ ...found, on: 'yes', way: 'spaced' })),
    stock: extra(plainExtraKeys.stock),
    weld: extra(plainExtraKeys.weld),
    code: extra(plainExtraKeys.code),
    volutes: extra(plainExtraKeys.volutes),
  }),
)

/** As an address bar hands it over. */
const throughAddress = (measure: Measure) =>
  readMeasure(new URLSearchParams(new URLSearchParams({ m: writeMeasure(measure) }).toString()).get('m'))

describe('any measure', () => {
  it('comes back from an address with every text as it was written', () => {
    fc.assert(
      fc.property(measures, (measure) => {
        const back = throughAddress(measure) ?? blankMeasure
        for (const path of shownPaths(measure)) expect(textAt(back, path)).toBe(textAt(measure, path))
        expect(inputsOf(back)).toEqual(inputsOf(measure))
      }),
    )
  })

  it('comes back from the inputs that it asks the engine with', () => {
    fc.assert(
      fc.property(measures, (measure) => {
        // An empty first measure is sent as a blank, which names it; it comes back as nothing written.
        const back = measureFromInputs(inputsOf(measure))
        for (const path of shownPaths(measure)) expect(textAt(back, path).trim()).toBe(textAt(measure, path).trim())
      }),
    )
  })

  it('holds what is written at any box of the sheet', () => {
    fc.assert(
      fc.property(measures, fc.nat(), written, (measure, at, text) => {
        const paths = shownPaths(measure)
        const path = paths[at % paths.length] ?? ''
        const changed = withText(measure, path, text)
        expect(textAt(changed, path)).toBe(text)
        for (const other of paths) if (other !== path) expect(textAt(changed, other)).toBe(textAt(measure, other))
      }),
    )
  })

  it('is itself again after a flight more and less, and after two mirrors', () => {
    fc.assert(
      fc.property(measures, (measure) => {
        const more = addFlight(measure)
        expect(more.landings).toHaveLength(more.flights.length - 1)
        expect(removeFlight(more, more.flights.length - 1)).toEqual(measure)
        expect(mirrorHand(mirrorHand(measure))).toEqual(measure)
      }),
    )
  })

  it('has a box, or at least its place, for every fault that the engine finds', () => {
    let found = 0
    fc.assert(
      fc.property(measures, (measure) => {
        const said = answer(asAny(handrail), inputsOf(measure), defaultPrecision)
        if (said.ok) return
        const paths = shownPaths(measure)
        const placed = placedFaults(measure, said.errors)
        found += placed.length
        // The engine reads before it works out: what it could not read has its box, and the order is the sheet's.
        const at = placed.map(({ field }) => paths.indexOf(field))
        expect(placed.filter((_, i) => at[i] === -1)).toEqual([])
        expect(at).toEqual([...at].sort((a, b) => a - b))
      }),
    )
    expect(found).toBeGreaterThan(100)
  })
})

describe('a section of one size', () => {
  const example = measureFromInputs(handrail.example)

  it('asks once and sends both', () => {
    expect(shownPaths(example)).not.toContain('section.width')
    expect(inputsOf(withText(example, 'section.depth', '1 1/2')).section).toEqual({
      shape: 'round',
      depth: '1 1/2',
      width: '1 1/2',
    })
  })

  it('says once what cannot be read, by its own name', () => {
    const measure = withText(example, 'section.depth', 'thick')
    const said = answer(asAny(handrail), inputsOf(measure), defaultPrecision)
    const faults = placedFaults(measure, said.ok ? [] : said.errors)
    expect(faults.map(({ field }) => field)).toEqual(['section.depth'])
    expect(faults[0]?.message).toMatch(/^Outside diameter: /)
  })

  it('asks for both where it is a rectangle', () => {
    const measure = withText(example, 'section.shape', 'rect')
    expect(shownPaths(measure)).toContain('section.width')
    const said = answer(asAny(handrail), inputsOf(measure), defaultPrecision)
    expect(placedFaults(measure, said.ok ? [] : said.errors)).toMatchObject([
      { field: 'section.width', message: 'Width is needed here.', missing: true },
    ])
  })

  it('takes saved sizes that differ for what they are', () => {
    const section = { shape: 'round', depth: 1.5, width: 2 }
    const measure = measureFromInputs({ ...handrail.example, section })
    expect(inputsOf(measure).section).toEqual({ shape: 'rect', depth: '1.5', width: '2' })
    const alike = measureFromInputs({ ...handrail.example, section: { shape: 'square', depth: '1 1/2', width: 1.5 } })
    expect(inputsOf(alike).section).toEqual({ shape: 'square', depth: '1 1/2', width: '1 1/2' })
  })
})
