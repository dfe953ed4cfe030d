import { describe, expect, it } from 'vitest'
import { wallReturn } from '@/lib/trade/wall-return'

describe('return to the wall', () => {
  it('is one rail width longer at its long point than at its short one', () => {
    expect(wallReturn({ outside: 1.5, clearance: 2.25, gap: 0.25 })).toEqual({
      longPoint: 3.5,
      centre: 2.75,
      shortPoint: 2,
      railCentreToWall: 3,
      miter: 45,
    })
  })

  it.each([
    ['outside', { outside: 0, clearance: 1.5 }],
    ['clearance', { outside: 1.5, clearance: 0 }],
    ['gap', { outside: 1.5, clearance: 1.5, gap: -1 }],
    ['gap', { outside: 1.5, clearance: 1.5, gap: 1.5 }],
  ])('refuses a %s that leaves no piece', (field, given) => {
    expect(wallReturn(given)).toMatchObject({ refused: true, field })
  })
})
