import fc from 'fast-check'
import type { BottomEnd, FlightByCount, HandrailInputs, Landing, TopEnd } from '@/lib/trade/rail/types'

const round = { shape: 'round' as const, depth: 1.5, width: 1.5 }
const flight = (risers: number, rise: number, run: number): FlightByCount => ({ risers, rise, run })
const landings = (flights: readonly unknown[]): Landing[] => flights.slice(1).map(() => ({ length: 48 }))

function rail(flights: FlightByCount[], rest: Partial<HandrailInputs> = {}): HandrailInputs {
  return {
    hand: 'L',
    section: round,
    railHeight: 36,
    flights,
    landings: landings(flights),
    bottom: { type: 'level', length: 12 },
    top: { type: 'level', length: 12 },
    brackets: { endDistance: 6, maxSpacing: 48 },
    stock: { length: 240, kerf: 0.0625 },
    ...rest,
  }
}

const shallow = (risers: number) => flight(risers, 4, 11)
const steep = (risers: number) => flight(risers, 9.5, 8)
const usual = (risers: number) => flight(risers, 7, 11)

/** Flat and steep, short and long, thin and thick, every end, one flight to four. */
export const extremeRails: HandrailInputs[] = [
  rail([shallow(4)]),
  rail([steep(4)], { hand: 'R' }),
  rail([shallow(20)], { section: { shape: 'rect', depth: 0.25, width: 1 } }),
  rail([steep(20)], { section: { shape: 'rect', depth: 6, width: 2 } }),
  rail([usual(13)], { bottom: { type: 'none' }, top: { type: 'none' } }),
  rail([usual(13)], {
    bottom: { type: 'slope', horizontal: 11 },
    top: { type: 'level', length: 30, railHeight: 38 },
    volutes: { bottom: 3 },
  }),
  rail([usual(8)], {
    bottom: { type: 'level', length: 12, return: { clearance: 2.25 } },
    top: { type: 'level', length: 14, return: { clearance: 2.25, gap: 0.125 } },
  }),
  rail([usual(6), usual(8)], { brackets: { field: [4, 20, 60, 140], jointClear: 3 } }),
  rail([usual(6), shallow(8), steep(5)], { hand: 'R' }),
  rail([usual(20), shallow(20), steep(4), usual(12)]),
]

const anyFlight = fc.record({
  risers: fc.integer({ min: 4, max: 20 }),
  rise: fc.double({ min: 4, max: 9.5, noNaN: true }),
  run: fc.double({ min: 9, max: 14, noNaN: true }),
})
const anyBottom: fc.Arbitrary<BottomEnd> = fc.constantFrom<BottomEnd>(
  { type: 'none' },
  { type: 'slope', horizontal: 11 },
  { type: 'level', length: 12 },
)
const anyTop: fc.Arbitrary<TopEnd> = fc.constantFrom<TopEnd>(
  { type: 'none' },
  { type: 'level', length: 12 },
  { type: 'level', length: 24, railHeight: 37 },
)

export const anyRail: fc.Arbitrary<HandrailInputs> = fc
  .record({
    hand: fc.constantFrom('L' as const, 'R' as const),
    depth: fc.double({ min: 0.75, max: 4, noNaN: true }),
    flights: fc.array(anyFlight, { minLength: 1, maxLength: 4 }),
    bottom: anyBottom,
    top: anyTop,
  })
  .map(({ depth, ...rest }) => rail(rest.flights, { ...rest, section: { shape: 'square', depth, width: depth } }))
