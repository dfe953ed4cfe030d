import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { pitchFrom } from '@/lib/trade/pitch'
import { isRefusal } from '@/lib/trade/refusal'

const pitched = (given: Parameters<typeof pitchFrom>[0]) => {
  const answer = pitchFrom(given)
  if (isRefusal(answer)) throw new Error(answer.message)
  return answer
}

describe('pitch from two tapes', () => {
  it('closes the 3-4-5 triangle from each pair', () => {
    for (const given of [
      { rise: 3, run: 4 },
      { rise: 3, rake: 5 },
      { run: 4, rake: 5 },
    ]) {
      const { rise, run, rake, inPer12 } = pitched(given)
      expect([rise, run, rake, inPer12].map((value) => Number(value.toFixed(9)))).toEqual([3, 4, 5, 9])
    }
  })

  it('is 45° where rise and run are equal, and 30° where the rake is twice the rise', () => {
    expect(pitched({ rise: 8, run: 8 }).pitch).toBeCloseTo(45, 10)
    expect(pitched({ rise: 8, rake: 16 }).pitch).toBeCloseTo(30, 10)
  })

  it('gives one triangle whichever two of its sides were taped', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 1, max: 200, noNaN: true }),
        fc.double({ min: 1, max: 200, noNaN: true }),
        (rise, run) => {
          const whole = pitched({ rise, run })
          const byRise = pitched({ rise, rake: whole.rake })
          expect(byRise.run).toBeCloseTo(run, 4)
          expect(pitched({ run, rake: whole.rake }).rise).toBeCloseTo(rise, 4)
        },
      ),
    )
  })

  it('takes rise and run when a third tape agrees within 1/16 in', () => {
    expect(pitched({ rise: 3, run: 4, rake: 5.06 }).rake).toBe(5)
  })

  it.each([
    ['a third tape that disagrees', { rise: 3, run: 4, rake: 5.2 }, 'rake'],
    ['one tape alone', { rise: 3 }, 'run'],
    ['no tape', {}, 'rise'],
    ['a rake alone', { rake: 5 }, 'rise'],
    ['a rake shorter than its rise', { rise: 5, rake: 4 }, 'rake'],
    ['a rake as long as its rise', { rise: 5, rake: 5 }, 'rake'],
    ['a rake shorter than its run', { run: 5, rake: 4 }, 'rake'],
    ['a run of nothing', { rise: 5, run: 0 }, 'run'],
    ['a rise below nothing', { rise: -1, run: 5 }, 'rise'],
  ])('refuses %s', (_, given, field) => {
    expect(pitchFrom(given)).toMatchObject({ refused: true, field })
  })
})
