import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { nestBar, type NestPiece, type NestedPiece } from '@/lib/trade/cut-list/nest'
import type { PieceEnd } from '@/lib/trade/piece'

const depth = 1.5
const kerf = 0.0625
const end: fc.Arbitrary<PieceEnd> = fc.oneof(
  fc.constant<PieceEnd>({ setback: 0, face: 'square' }),
  fc.record({
    setback: fc.constantFrom(0.2, 0.44, 0.44, 0.8, 1.5),
    face: fc.constantFrom('top' as const, 'underside' as const),
  }),
)
const bar: fc.Arbitrary<NestPiece[]> = fc
  .array(fc.record({ overall: fc.double({ min: 4, max: 60, noNaN: true }), endA: end, endB: end }), {
    minLength: 1,
    maxLength: 8,
  })
  .map((pieces) => pieces.map((piece, i) => ({ mark: `P${i}`, ...piece })))

/** Distance between two straight cuts measured square to `cut`, at its worst corner. */
function clearOf(before: NestedPiece, after: NestedPiece): number {
  const gaps = [after.topStart - before.topEnd, after.undersideStart - before.undersideEnd]
  const steepest = Math.max(
    Math.abs(before.topEnd - before.undersideEnd),
    Math.abs(after.topStart - after.undersideStart),
  )
  return Math.min(...gaps) * (depth / Math.hypot(depth, steepest))
}

const shape = (start: number, end: number) => Number((end - start).toFixed(9))

describe('nesting mitered pieces in a bar', () => {
  it('never overlaps, always leaves the kerf, and lays every piece once', () => {
    fc.assert(
      fc.property(bar, (pieces) => {
        const { pieces: laid, length } = nestBar(pieces, kerf, depth)
        expect(laid.map(({ mark }) => mark).sort()).toEqual(pieces.map(({ mark }) => mark).sort())
        for (const [i, piece] of laid.entries()) {
          const before = laid[i - 1]
          if (before) expect(clearOf(before, piece)).toBeGreaterThanOrEqual(kerf - 1e-9)
          expect(Math.max(piece.topEnd, piece.undersideEnd)).toBeLessThanOrEqual(length + 1e-9)
        }
        expect(Math.min(laid[0]?.topStart ?? -1, laid[0]?.undersideStart ?? -1)).toBe(0)
      }),
    )
  })

  it('keeps the shape of every piece, however it is turned', () => {
    fc.assert(
      fc.property(bar, (pieces) => {
        for (const laid of nestBar(pieces, kerf, depth).pieces) {
          const { overall, endA, endB } = pieces.find(({ mark }) => mark === laid.mark) ?? {
            overall: 0,
            endA: null,
            endB: null,
          }
          const edges = [shape(laid.topStart, laid.topEnd), shape(laid.undersideStart, laid.undersideEnd)].sort(
            (a, b) => a - b,
          )
          const back = (face: 'top' | 'underside') =>
            [endA, endB].reduce(
              (sum, cut) => sum + (cut && cut.face !== 'square' && cut.face !== face ? cut.setback : 0),
              0,
            )
          const expected = [shape(back('top'), overall), shape(back('underside'), overall)].sort((a, b) => a - b)
          expect(edges[0]).toBeCloseTo(expected[0] ?? NaN, 6)
          expect(edges[1]).toBeCloseTo(expected[1] ?? NaN, 6)
        }
      }),
    )
  })

  it('lets parallel cuts share one cut and saves their setback', () => {
    const cut = (face: 'top' | 'underside') => ({ setback: 1.5, face })
    const parallel = { overall: 20, endA: cut('underside'), endB: cut('top') }
    const { saved, length } = nestBar(
      [
        { mark: 'A', ...parallel },
        { mark: 'B', ...parallel },
      ],
      0.1,
      1.5,
    )
    // At 45° the setback is the depth, and the kerf takes its diagonal.
    expect(length).toBeCloseTo(40 - 1.5 + 0.1 * Math.SQRT2, 9)
    expect(saved).toBeCloseTo(1.5 - 0.1 * (Math.SQRT2 - 1), 9)
  })

  it('rolls a piece to bring its cut parallel, and turns one end for end to bring mitered ends together', () => {
    const square: PieceEnd = { setback: 0, face: 'square' }
    const top: PieceEnd = { setback: 0.5, face: 'top' }
    const { saved } = nestBar(
      [
        { mark: 'A', overall: 20, endA: square, endB: top },
        { mark: 'B', overall: 30, endA: square, endB: top },
      ],
      0,
      depth,
    )
    expect(saved).toBeCloseTo(0.5, 9)
  })

  it('never loses more than a blade standing askew costs', () => {
    fc.assert(
      fc.property(bar, (pieces) => {
        const { saved } = nestBar(pieces, kerf, depth)
        expect(saved).toBeGreaterThanOrEqual(-kerf * (Math.SQRT2 - 1) * pieces.length)
      }),
    )
  })
})
