import fc from 'fast-check'
import type { BottomEnd, Flight, HandrailInputs, Landing, Section, TopEnd } from '@/lib/trade/rail/types'

/** Lengths as a tape gives them: to 1/16 in. */
const taped = (least: number, most: number) =>
  fc.integer({ min: Math.ceil(least * 16), max: Math.floor(most * 16) }).map((n) => n / 16)

const byCount = fc.record({ risers: fc.integer({ min: 3, max: 14 }), rise: taped(5, 8), run: taped(9.5, 13) })

const byRake = fc.record({
  rake: taped(40, 170),
  pitch: fc.integer({ min: 80, max: 180 }).map((quarters) => quarters / 4),
  firstRise: taped(4, 8),
  run: taped(9.5, 13),
})

const byTape = taped(40, 150).chain((nosingRun) =>
  fc.record({
    nosingRun: fc.constant(nosingRun),
    nosingRise: taped(nosingRun * 0.4, nosingRun * 0.9),
    firstRise: taped(4, 8),
    run: taped(9.5, 13),
  }),
)

const flight: fc.Arbitrary<Flight> = fc.oneof(byCount, byRake, byTape)
const height = fc.option(taped(34, 38), { nil: null })
const slopeInPerFt = fc.option(taped(-0.5, 0.5), { nil: null })
const toWall = fc.option(fc.record({ clearance: taped(1.5, 3), gap: taped(0, 0.5) }), { nil: null })

const landing: fc.Arbitrary<Landing> = fc.record({ length: taped(40, 90), slopeInPerFt, railHeight: height })

const bottom: fc.Arbitrary<BottomEnd> = fc.oneof(
  fc.record({ type: fc.constant('none' as const), return: toWall }),
  fc.record({ type: fc.constant('slope' as const), horizontal: taped(4, 20), return: toWall }),
  fc.record({ type: fc.constant('level' as const), length: taped(6, 40), railHeight: height, return: toWall }),
)

const top: fc.Arbitrary<TopEnd> = fc.oneof(
  fc.record({ type: fc.constant('none' as const), return: toWall }),
  fc.record({
    type: fc.constant('level' as const),
    length: taped(8, 40),
    slopeInPerFt,
    railHeight: height,
    return: toWall,
  }),
)

const section: fc.Arbitrary<Section> = fc.oneof(
  taped(1, 2).map((size) => ({ shape: 'round' as const, depth: size, width: size })),
  taped(1, 2).map((size) => ({ shape: 'square' as const, depth: size, width: size })),
  fc.record({ shape: fc.constant('rect' as const), depth: taped(0.5, 2.5), width: taped(0.5, 2.5) }),
)

/** Field measures of rails with one to three flights, measured in any form, every kind of end and landing. */
export const railFields: fc.Arbitrary<HandrailInputs> = fc.integer({ min: 1, max: 3 }).chain((flights) =>
  fc.record({
    hand: fc.constantFrom('L' as const, 'R' as const),
    section,
    railHeight: taped(34, 38),
    flights: fc.array(flight, { minLength: flights, maxLength: flights }),
    landings: fc.array(landing, { minLength: flights - 1, maxLength: flights - 1 }),
    bottom,
    top,
    stock: fc.constant({ length: 288, kerf: 0.0625, trim: 0.5 }),
    brackets: fc.constant({ endDistance: 6, maxSpacing: 48 }),
    weld: fc.constant({ areaIn2: 0.02, efficiency: 0.93, lbPerHour: 3, arcOnPct: 25 }),
    code: fc.constant({ outsideDia: 1.5, wallClearance: 2.25 }),
  }),
)
