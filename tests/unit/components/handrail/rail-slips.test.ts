import { describe, expect, it } from 'vitest'
import { railSlips } from '@/components/calculator/handrail/rail-slips'
import { defaultPrecision } from '@/lib/calculators/fields'
import type { HandrailInputs } from '@/lib/trade/rail/types'

/** One flight, square at both nosings: the top edge is the rake itself. */
const oneFlight: HandrailInputs = {
  hand: 'L',
  section: { shape: 'round', depth: 1.5, width: 1.5 },
  railHeight: 36,
  flights: [{ nosingRise: 30, nosingRun: 40 }],
  landings: null,
  bottom: { type: 'none', return: null },
  top: { type: 'none', return: null },
  volutes: null,
  brackets: null,
  stock: null,
  weld: null,
  code: null,
}

describe('being off', () => {
  it('moves a plain rake by the slope of its triangle', () => {
    // 3-4-5: 1/16 in more run makes the rake √(30² + 40.0625²), 1/16 in more rise √(30.0625² + 40²).
    const [run, rise] = railSlips(oneFlight, defaultPrecision)
    expect(run?.path).toBe('flights[0].nosingRun')
    expect(run?.length).toBeCloseTo(Math.hypot(30, 40.0625) - 50, 9)
    expect(rise?.path).toBe('flights[0].nosingRise')
    expect(rise?.length).toBeCloseTo(Math.hypot(30.0625, 40) - 50, 9)
    expect([run?.cut, rise?.cut]).toEqual([0, 0])
  })

  it('moves a cut by half of what the pitch moves', () => {
    const slips = railSlips(
      { ...oneFlight, flights: [{ rake: 50, pitch: 34 }], top: { type: 'level', length: 12, return: null } },
      defaultPrecision,
    )
    const pitch = slips.find(({ path }) => path === 'flights[0].pitch')
    expect(pitch?.off).toBe('deg')
    expect(pitch?.cut).toBeCloseTo(0.25, 9)
  })

  it('is silent where there is no rail', () => {
    expect(railSlips({ ...oneFlight, landings: [{ length: 40 }] } as HandrailInputs, defaultPrecision)).toEqual([])
  })
})
