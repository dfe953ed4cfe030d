import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { pieceFrom, type EndFace, type PieceGiven } from '@/lib/trade/piece'
import { isRefusal } from '@/lib/trade/refusal'

const solved = (given: PieceGiven) => {
  const piece = pieceFrom(given)
  if (isRefusal(piece)) throw new Error(piece.message)
  return piece
}

const face = fc.constantFrom<EndFace>('top', 'underside')
const miter = fc.double({ min: 0.5, max: 40, noNaN: true })

describe('one piece from one of its lengths', () => {
  it('is a trapezoid where both long points are on top: 45° takes one depth off each end', () => {
    expect(
      solved({ length: 20, ref: 'top', depth: 2, miterA: 45, faceA: 'top', miterB: 45, faceB: 'top' }),
    ).toMatchObject({
      topEdge: 20,
      centre: expect.closeTo(18, 9),
      underside: expect.closeTo(16, 9),
      overall: expect.closeTo(20, 9),
      cuts: 'opposed: roll the stock half a turn between cuts',
    })
  })

  it('is a parallelogram where the long points are on opposite faces: edges equal, blank longer by one setback', () => {
    expect(
      solved({ length: 20, ref: 'top', depth: 2, miterA: 45, faceA: 'underside', miterB: 45, faceB: 'top' }),
    ).toMatchObject({
      underside: expect.closeTo(20, 9),
      overall: expect.closeTo(22, 9),
      cuts: 'parallel: slide the stock, do not roll it',
    })
  })

  it('comes out the same whichever of its lengths was taped', () => {
    fc.assert(
      fc.property(
        miter,
        face,
        miter,
        face,
        fc.double({ min: 10, max: 200, noNaN: true }),
        (miterA, faceA, miterB, faceB, length) => {
          const cut = { depth: 1.5, miterA, faceA, miterB, faceB }
          const piece = solved({ ...cut, length, ref: 'top' })
          for (const [ref, from] of [
            ['underside', piece.underside],
            ['centre', piece.centre],
            ['overall', piece.overall],
          ] as const) {
            expect(solved({ ...cut, length: from, ref }).topEdge).toBeCloseTo(length, 9)
          }
          expect(piece.overall).toBeGreaterThanOrEqual(Math.max(piece.topEdge, piece.underside) - 1e-9)
        },
      ),
    )
  })

  it('is square at 0°, whatever face was named', () => {
    expect(solved({ length: 9, ref: 'centre', depth: 1.5, faceA: 'top', faceB: 'square' })).toMatchObject({
      topEdge: 9,
      overall: 9,
      cuts: 'square both ends',
    })
  })

  it.each([
    ['length', { length: 0 }],
    ['depth', { depth: 0 }],
    ['miterA', { miterA: 90 }],
    ['miterB', { miterB: -1 }],
    ['faceB', { miterB: 10, faceB: 'square' as const }],
    ['length', { length: 2.5, miterA: 45, miterB: 45 }],
  ])('refuses a %s that cannot be cut', (field, wrong) => {
    const given: PieceGiven = {
      length: 20,
      ref: 'top',
      depth: 2,
      miterA: 10,
      faceA: 'top',
      miterB: 10,
      faceB: 'top',
      ...wrong,
    }
    expect(pieceFrom(given)).toMatchObject({ refused: true, field })
  })
})
