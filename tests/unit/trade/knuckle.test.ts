import { describe, expect, it } from 'vitest'
import { knuckles } from '@/lib/trade/knuckle'

/** A pitch of 3 in 4, where every inch of height moves the knuckle 4/3 in. */
const pitch = (Math.atan2(3, 4) * 180) / Math.PI

describe('knuckle heights', () => {
  it('stands plumb over the top nosing where the heights are equal, one tread before the bottom one', () => {
    const answer = knuckles({ pitch, rakeHeight: 36, topLevelHeight: 36, bottomLevelHeight: 36, firstRise: 7.5 })
    expect(answer).toEqual({ pastTopNosing: 0, beforeBottomNosing: expect.closeTo(10, 9) })
  })

  it('moves over the landing for a higher level run, back for a lower one', () => {
    expect(knuckles({ pitch, rakeHeight: 34, topLevelHeight: 37 })).toHaveProperty(
      'pastTopNosing',
      expect.closeTo(4, 9),
    )
    expect(knuckles({ pitch, rakeHeight: 37, topLevelHeight: 34 })).toHaveProperty(
      'pastTopNosing',
      expect.closeTo(-4, 9),
    )
  })

  it('says nothing of the bottom where its height or first rise was not given', () => {
    expect(knuckles({ pitch, rakeHeight: 36, topLevelHeight: 36, firstRise: 7 })).toHaveProperty(
      'beforeBottomNosing',
      null,
    )
    expect(knuckles({ pitch, rakeHeight: 36, topLevelHeight: 36, bottomLevelHeight: 36 })).toHaveProperty(
      'beforeBottomNosing',
      null,
    )
  })

  it.each([
    ['pitch', { pitch: 0, rakeHeight: 36, topLevelHeight: 36 }],
    ['pitch', { pitch: 90, rakeHeight: 36, topLevelHeight: 36 }],
    ['rakeHeight', { pitch, rakeHeight: 0, topLevelHeight: 36 }],
    ['topLevelHeight', { pitch, rakeHeight: 36, topLevelHeight: -1 }],
  ])('refuses a %s that gives no knuckle', (field, given) => {
    expect(knuckles(given)).toMatchObject({ refused: true, field })
  })
})
