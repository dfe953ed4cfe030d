import { describe, expect, it } from 'vitest'
import { nosingLine } from '@/lib/trade/nosing-line'

describe('nosing line', () => {
  it('makes one step of rake less than there are risers', () => {
    expect(nosingLine({ risers: 5, rise: 6, run: 8 })).toMatchObject({
      unitRake: 10,
      rakeNosingToNosing: 40,
      runNosingToNosing: 32,
      riseNosingToNosing: 24,
      totalRise: 30,
    })
  })

  it.each([
    ['risers', { risers: 1, rise: 7, run: 11 }],
    ['risers', { risers: 4.5, rise: 7, run: 11 }],
    ['rise', { risers: 4, rise: 0, run: 11 }],
    ['run', { risers: 4, rise: 7, run: NaN }],
  ])('refuses %s that make no flight', (field, given) => {
    expect(nosingLine(given)).toMatchObject({ refused: true, field })
  })
})
