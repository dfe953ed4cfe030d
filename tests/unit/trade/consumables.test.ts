import { describe, expect, it } from 'vitest'
import { consumables } from '@/lib/trade/consumables'

const given = { areaIn2: 0.0176, lengthIn: 96, efficiency: 0.5, lbPerHour: 3, arcOnPct: 25 }

describe('filler and time', () => {
  it('buys twice what it lays at half efficiency, and takes four times the arc at a quarter on', () => {
    const answer = consumables(given)
    if ('refused' in answer) throw new Error(answer.message)
    expect(answer.fillerLb).toBeCloseTo(2 * answer.depositedLb, 12)
    expect(answer.clockMinutes).toBeCloseTo(4 * answer.arcMinutes, 12)
  })

  it.each([
    ['areaIn2', -1],
    ['lengthIn', -1],
    ['efficiency', 0],
    ['efficiency', 1.01],
    ['lbPerHour', 0],
    ['arcOnPct', 0],
    ['arcOnPct', 101],
  ])('refuses %s of %d', (field, value) => {
    expect(consumables({ ...given, [field]: value })).toMatchObject({ refused: true, field })
  })
})
