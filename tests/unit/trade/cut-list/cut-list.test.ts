import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { cutList, type CutListAnswer, type CutListGiven } from '@/lib/trade/cut-list/cut-list'
import { isRefusal } from '@/lib/trade/refusal'

const listed = (given: CutListGiven): CutListAnswer => {
  const answer = cutList(given)
  if (isRefusal(answer)) throw new Error(answer.message)
  return answer
}

const anyList: fc.Arbitrary<CutListGiven> = fc.record({
  pieces: fc.array(
    fc.integer({ min: 32, max: 2000 }).map((n) => n / 16),
    { minLength: 1, maxLength: 30 },
  ),
  stock: fc.constantFrom(240, 252, 288),
  kerf: fc.constantFrom(0, 0.035, 0.0625, 0.125),
  trim: fc.constantFrom(0, 0.5, 1),
})

const sum = (values: readonly number[]) => values.reduce((a, b) => a + b, 0)

describe('cut list', () => {
  it('places every piece once, fits every bar and never beats its own bound', () => {
    fc.assert(
      fc.property(anyList, (given) => {
        const { sticks, bars, drops, at, bound, proved } = listed(given)
        const usable = given.stock - (given.trim ?? 0)
        expect(at.flat().sort((a, b) => a - b)).toEqual(given.pieces.map((_, i) => i))
        expect(at.map((bar) => bar.map((place) => given.pieces[place]))).toEqual(bars)
        expect(bars).toHaveLength(sticks)
        expect(bound).toBeLessThanOrEqual(sticks)
        expect(proved).toBe(bound === sticks)
        for (const [i, bar] of bars.entries()) {
          expect(sum(bar) + given.kerf * (bar.length - 1)).toBeLessThanOrEqual(usable + 1e-6)
          expect(drops[i]).toBeCloseTo(Math.max(0, usable - sum(bar) - given.kerf * bar.length), 9)
          expect([...bar].sort((a, b) => b - a)).toEqual(bar)
        }
      }),
    )
  })

  it('proves its count up to 20 pieces', () => {
    fc.assert(
      fc.property(fc.array(fc.double({ min: 5, max: 150, noNaN: true }), { minLength: 1, maxLength: 20 }), (pieces) => {
        expect(listed({ pieces, stock: 240, kerf: 0.0625, trim: 0.5 }).proved).toBe(true)
      }),
    )
  })

  it('does not care in which order the pieces were written', () => {
    fc.assert(
      fc.property(anyList, ({ pieces, ...rest }) => {
        const forward = listed({ pieces, ...rest })
        const backward = listed({ pieces: [...pieces].reverse(), ...rest })
        expect(backward.bars).toEqual(forward.bars)
      }),
    )
  })

  it('counts the kerf between pieces only: a full stick needs none after its last piece', () => {
    expect(listed({ pieces: [119.9375, 119.9375], stock: 240, kerf: 0.125 })).toMatchObject({ sticks: 1, drops: [0] })
    expect(listed({ pieces: [119.9375, 119.9375], stock: 240, kerf: 0.126 }).sticks).toBe(2)
  })

  it('finds what longest-first misses', () => {
    // Longest first lays 3 + 3, 2 + 2 + 2 and strands a 2.
    expect(listed({ pieces: [3, 3, 2, 2, 2, 2], stock: 7, kerf: 0 })).toMatchObject({
      sticks: 2,
      proved: true,
      bars: [
        [3, 2, 2],
        [3, 2, 2],
      ],
      yieldPct: 100,
    })
  })

  it.each<[string, Partial<CutListGiven>]>([
    ['pieces', { pieces: [] }],
    ['pieces[1]', { pieces: [10, 239.6] }],
    ['pieces[1]', { pieces: [10, 0] }],
    ['stock', { stock: 0 }],
    ['kerf', { kerf: -0.1 }],
    ['trim', { trim: 240 }],
    ['trim', { trim: -1 }],
  ])('refuses %s by name', (field, wrong) => {
    expect(cutList({ pieces: [10, 20], stock: 240, kerf: 0.0625, trim: 0.5, ...wrong })).toMatchObject({
      refused: true,
      field,
    })
  })
})
