import { describe, expect, it } from 'vitest'
import { fieldCheck } from '@/lib/trade/field-check'

const at = (rake: number, angleFinder: number) => fieldCheck({ rise: 60, run: 80, rake, angleFinder })
const pitch = (Math.atan2(3, 4) * 180) / Math.PI

describe('closing a field measure', () => {
  it.each([
    [100, pitch, 'agree'],
    [100.125, pitch + 0.5, 'agree'],
    [99.875, pitch - 0.5, 'agree'],
    [100, pitch + 0.51, 'trust the tape, re-read the angle finder'],
    [100.13, pitch, 'measure again'],
    [99.87, pitch + 2, 'measure again'],
  ])('a rake of %d in at %d° reads: %s', (rake, finder, verdict) => {
    expect(at(rake, finder)).toMatchObject({ verdict })
  })

  it('drifts 3 in over 14 ft for one degree too steep, and as much the other way', () => {
    // The caution of the contract: 1 degree over 14 ft is 3 in.
    const long = (finder: number) => fieldCheck({ rise: 100.8, run: 134.4, rake: 168, angleFinder: finder })
    expect(long(pitch + 1)).toHaveProperty('driftAtEnd', expect.closeTo(2.93, 2))
    expect(long(pitch - 1)).toHaveProperty('driftAtEnd', expect.closeTo(-2.93, 2))
  })

  it.each([
    ['rise', { rise: 0, run: 80, rake: 100, angleFinder: 30 }],
    ['run', { rise: 60, run: -1, rake: 100, angleFinder: 30 }],
    ['rake', { rise: 60, run: 80, rake: 60, angleFinder: 30 }],
  ])('refuses a %s that makes no triangle', (field, given) => {
    expect(fieldCheck(given)).toMatchObject({ refused: true, field })
  })
})
