import fc from 'fast-check'
import { cutList, type CutListGiven } from '@/lib/trade/cut-list/cut-list'
import { fieldCheck } from '@/lib/trade/field-check'
import { knuckles, type KnuckleGiven } from '@/lib/trade/knuckle'
import { miterAt } from '@/lib/trade/miter'
import { nosingLine } from '@/lib/trade/nosing-line'
import { pieceFrom, type PieceGiven } from '@/lib/trade/piece'
import { pitchFrom } from '@/lib/trade/pitch'
import { solveHandrail } from '@/lib/trade/rail/solve'
import type { HandrailInputs } from '@/lib/trade/rail/types'
import { isRefusal } from '@/lib/trade/refusal'
import { sawDial } from '@/lib/trade/saw-dial'
import { anyRail, extremeRails } from './rails'

/** What one drawing is tried on: the ends of its range, and anything between. */
export interface Cases {
  extremes: object[]
  any: fc.Arbitrary<object>
  /** Null where the trade maths refuses the numbers: then there is nothing to draw. */
  solve: (given: object) => object | null
}

function cases<G extends object>(solve: (given: G) => object, extremes: G[], any: fc.Arbitrary<G>): Cases {
  return {
    extremes,
    any,
    solve: (given) => {
      const solved = solve(given as G)
      return isRefusal(solved) ? null : solved
    },
  }
}

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true })
const sixteenths = (min: number, max: number) => fc.integer({ min: min * 16, max: max * 16 }).map((n) => n / 16)
const face = fc.constantFrom('top' as const, 'underside' as const)

const anyPiece: fc.Arbitrary<PieceGiven> = fc.record({
  length: sixteenths(4, 240),
  ref: fc.constantFrom('top', 'underside', 'centre', 'overall'),
  depth: sixteenths(1, 3),
  miterA: between(1, 45),
  faceA: face,
  miterB: between(1, 45),
  faceB: face,
})

const tape = ({ decimalIn, den }: { decimalIn: number; den: number }) => {
  const nearest = Math.round(decimalIn * den) / den
  return { nearest, roundingError: nearest - decimalIn, mm: decimalIn * 25.4 }
}

export const casesOf: Readonly<Record<string, Cases>> = {
  miter: cases(
    ({ slopeBelow, slopeAbove, depth }) => miterAt(slopeBelow, slopeAbove, depth, 0.25),
    [
      { slopeBelow: 20, slopeAbove: 0, depth: 1.5 },
      { slopeBelow: 50, slopeAbove: 0, depth: 0.25 },
      { slopeBelow: 0, slopeAbove: 50, depth: 24 },
      { slopeBelow: 50, slopeAbove: -40, depth: 1.5 },
      { slopeBelow: 30, slopeAbove: 30, depth: 1.5 },
    ],
    fc.record({ slopeBelow: between(-45, 45), slopeAbove: between(-45, 45), depth: between(0.25, 6) }),
  ),
  pitch: cases(
    (given) => pitchFrom(given),
    [
      { rise: 4, run: 11 },
      { rise: 13, run: 11 },
      { rise: 0.5, run: 240 },
      { rise: 140, run: 120 },
    ],
    fc.record({ rise: sixteenths(2, 160), run: sixteenths(4, 240) }),
  ),
  'tape-math': cases(
    tape,
    [
      { decimalIn: 0.0625, den: 16 },
      { decimalIn: 959.99, den: 32 },
      { decimalIn: 0.1, den: 8 },
    ],
    fc.record({ decimalIn: between(0.0625, 960), den: fc.constantFrom(8, 16, 32) }),
  ),
  'field-check': cases(
    (given) => fieldCheck(given),
    [
      { rise: 84, run: 132, rake: 156.4609, angleFinder: 32.5 },
      { rise: 84, run: 132, rake: 150, angleFinder: 40 },
      { rise: 40, run: 110, rake: 120, angleFinder: 15 },
      { rise: 131, run: 110, rake: 171.2, angleFinder: 50 },
    ],
    fc
      .record({ rise: sixteenths(20, 130), pitch: between(20, 50), off: between(-1, 1), finder: between(-3, 3) })
      .map(({ rise, pitch, off, finder }) => ({
        rise,
        run: rise / Math.tan((pitch * Math.PI) / 180),
        rake: rise / Math.sin((pitch * Math.PI) / 180) + off,
        angleFinder: pitch + finder,
      })),
  ),
  'nosing-line': cases(
    (given) => nosingLine(given),
    [
      { risers: 2, rise: 4, run: 14 },
      { risers: 4, rise: 9.5, run: 9 },
      { risers: 20, rise: 4, run: 11 },
      { risers: 20, rise: 9.5, run: 9 },
    ],
    fc.record({ risers: fc.integer({ min: 2, max: 20 }), rise: between(4, 9.5), run: between(9, 14) }),
  ),
  'knuckle-height': cases<KnuckleGiven>(
    (given) => knuckles(given),
    [
      { pitch: 20, rakeHeight: 34, topLevelHeight: 38 },
      { pitch: 50, rakeHeight: 38, topLevelHeight: 34, bottomLevelHeight: 38, firstRise: 9.5 },
      { pitch: 20, rakeHeight: 36, topLevelHeight: 36, bottomLevelHeight: 34, firstRise: 4 },
    ],
    fc.record({
      pitch: between(20, 50),
      rakeHeight: between(30, 42),
      topLevelHeight: between(30, 42),
      bottomLevelHeight: between(30, 42),
      firstRise: between(4, 9.5),
    }),
  ),
  'long-short-point': cases<PieceGiven>(
    (given) => pieceFrom(given),
    [
      { length: 4, ref: 'centre', depth: 1.5, miterA: 45, faceA: 'top', miterB: 45, faceB: 'underside' },
      { length: 240, ref: 'top', depth: 0.25, miterA: 16.25, faceA: 'top', miterB: 0, faceB: 'square' },
      { length: 60, ref: 'underside', depth: 6, miterA: 0, faceA: 'square', miterB: 0, faceB: 'square' },
    ],
    anyPiece,
  ),
  'saw-dial': cases(
    (given) => sawDial(given),
    [
      { fromSquare: 0, sawMax: 45, step: 0.25 },
      { fromSquare: 45, sawMax: 45, step: 1 },
      { fromSquare: 88, sawMax: 60, step: 0.5 },
    ],
    fc.record({ fromSquare: between(0, 90), sawMax: between(30, 60), step: fc.constantFrom(0.25, 0.5, 1) }),
  ),
  'cut-list': cases<CutListGiven>(
    (given) => cutList(given),
    [
      { pieces: [12], stock: 240, kerf: 0.0625 },
      { pieces: Array.from({ length: 40 }, (_, i) => 3 + i), stock: 240, kerf: 0.125, trim: 1 },
      { pieces: [239, 239, 238, 120, 119.5, 2, 2, 2, 2], stock: 240, kerf: 0.0625 },
    ],
    fc.record({
      pieces: fc.array(sixteenths(2, 230), { minLength: 1, maxLength: 14 }),
      stock: fc.constantFrom(240, 252, 288),
      kerf: fc.constant(0.0625),
    }),
  ),
  handrail: cases<HandrailInputs>((given) => solveHandrail(given, { tape: 16, dial: 0.25 }), extremeRails, anyRail),
}
