import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { spaceMarks } from '@/lib/trade/spacing'

describe('even spacing', () => {
  it('fills the length with the fewest equal spaces, the greatest one allowed', () => {
    expect(spaceMarks(108, 6, 48)).toEqual({ spaces: 2, spacing: 48, marks: [6, 54, 102] })
    expect(spaceMarks(109, 6, 48).spaces).toBe(3)
  })

  it('is not tipped into one more space by a binary fraction', () => {
    expect(spaceMarks(12 + 3 * 0.1, 6, 0.1).spaces).toBe(3)
  })

  it('sets one mark in the middle of a length too short for two', () => {
    expect(spaceMarks(10, 6, 48).marks).toEqual([5])
    expect(spaceMarks(12, 6, 48).marks).toEqual([6])
  })

  it('never passes the greatest spacing and always ends one end distance short', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 13, max: 400, noNaN: true }),
        fc.double({ min: 1, max: 60, noNaN: true }),
        (length, most) => {
          const { spacing, marks } = spaceMarks(length, 6, most)
          expect(spacing).toBeLessThanOrEqual(most + 1e-6)
          expect(marks[0]).toBe(6)
          expect(marks.at(-1)).toBeCloseTo(length - 6, 6)
        },
      ),
    )
  })
})
