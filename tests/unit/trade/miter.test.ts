import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { miterAt } from '@/lib/trade/miter'

const slope = fc.double({ min: -60, max: 60, noNaN: true })

describe('miter where two runs meet', () => {
  it('is half the bend, long on top where the line turns down going up the stairs', () => {
    expect(miterAt(32, 0, 1.5, 0.25)).toMatchObject({ bend: 32, miter: 16, included: 148, longPointFace: 'top' })
    expect(miterAt(0, 32, 1.5, 0.25)).toMatchObject({ bend: 32, miter: 16, longPointFace: 'underside' })
    expect(miterAt(33, -2, 1.5, 0.25)).toMatchObject({ bend: 35, longPointFace: 'top' })
    expect(miterAt(-2, 33, 1.5, 0.25)).toMatchObject({ bend: 35, longPointFace: 'underside' })
  })

  it('sets back by the depth at a right-angled corner', () => {
    expect(miterAt(45, -45, 2, 0.25)).toMatchObject({ miter: 45, setback: expect.closeTo(2, 12), dialGap: 0 })
  })

  it('has no long point where nothing bends, the noise of binary fractions included', () => {
    expect(miterAt(30, 30 + 1e-13, 1.5, 0.25)).toMatchObject({
      bend: 0,
      longPointFace: 'none',
      setback: 0,
      included: 180,
    })
  })

  it('rounds to the step of the dial and says what that costs', () => {
    expect(miterAt(32.4712, 0, 1.5, 1)).toMatchObject({ sawSquareIs0: 16, sawSquareIs90: 74 })
    expect(miterAt(32.4712, 0, 1.5, 0.5)).toMatchObject({ sawSquareIs0: 16, sawSquareIs90: 74 })
    expect(miterAt(32.5, 0, 1.5, 0.25)).toMatchObject({ sawSquareIs0: 16.25, dialGap: 0 })
  })

  it('mirrors: the two ways along the rail give one cut on opposite faces', () => {
    fc.assert(
      fc.property(slope, slope, (below, above) => {
        const up = miterAt(below, above, 1.5, 0.25)
        const down = miterAt(above, below, 1.5, 0.25)
        expect(down.setback).toBe(up.setback)
        expect(down.sawSquareIs0 + down.sawSquareIs90).toBe(90)
        expect(Math.abs(down.sawSquareIs0 - up.miter)).toBeLessThanOrEqual(0.125 + 1e-9)
        if (up.longPointFace !== 'none') expect(down.longPointFace).not.toBe(up.longPointFace)
      }),
    )
  })
})
