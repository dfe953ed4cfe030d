import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { solveHandrail } from '@/lib/trade/rail/solve'
import { isRefusal } from '@/lib/trade/refusal'
import { solved } from '@/tests/support/plain-rail'
import { railFields } from '@/tests/support/rail-fields'

const near = (value: number) => expect.closeTo(value, 9)
const level = (length: number) => ({ type: 'level' as const, length })

describe('spaced brackets', () => {
  it('divide every rake, and another part only with a foot between its end distances', () => {
    const parts = (length: number) =>
      solved({ top: level(length), brackets: { endDistance: 6, maxSpacing: 48 } }).brackets?.map((set) =>
        'part' in set ? set.part : '',
      )
    expect(parts(24)).toEqual(['A', 'B'])
    expect(parts(23.9)).toEqual(['A'])
  })

  it('warn of a gap over a knuckle', () => {
    const { warnings } = solved({ top: level(60), brackets: { endDistance: 20, maxSpacing: 36 } })
    expect(warnings).toEqual([{ field: 'brackets.maxSpacing', message: expect.stringContaining('40 in') }])
  })

  it('carry the gap across a part that has none of its own', () => {
    const { warnings } = solved({
      flights: [
        { risers: 11, rise: 6, run: 8 },
        { risers: 11, rise: 6, run: 8 },
      ],
      landings: [{ length: 28 }],
      brackets: { endDistance: 6, maxSpacing: 30 },
    })
    // 6 on the lower rake, 20 of landing, 6 on the upper one.
    expect(warnings).toMatchObject([{ message: expect.stringMatching(/^32 in .* part A .* part C/) }])
  })

  it('set one in the middle of a rake too short for two, and say so', () => {
    const { brackets, warnings } = solved({
      flights: [{ risers: 2, rise: 6, run: 8 }],
      brackets: { endDistance: 6, maxSpacing: 48 },
    })
    expect(brackets).toMatchObject([{ alongTopFromLowEnd: [near(5)] }])
    expect(warnings).toMatchObject([{ field: 'brackets.endDistance' }])
  })

  it('warn of a mark that plumbs past the underside', () => {
    const { warnings } = solved({ brackets: { endDistance: 1, maxSpacing: 48 } })
    expect(warnings).toMatchObject([{ field: 'brackets.endDistance', message: expect.stringContaining('underside') }])
  })

  it('stand plumb under their marks: both faces at one place on the stair', () => {
    fc.assert(
      fc.property(railFields, (field) => {
        const rail = solveHandrail(field, { tape: 16, dial: 0.25 })
        if (isRefusal(rail)) return
        for (const set of rail.brackets ?? []) {
          const part = rail.parts.find(({ mark }) => 'part' in set && mark === set.part)
          if (!part || !('spacing' in set)) throw new Error('A bracket without its part')
          const across = Math.cos((part.slope * Math.PI) / 180)
          for (const [i, top] of set.alongTopFromLowEnd.entries()) {
            const under = set.alongUndersideFromLowEnd[i] ?? NaN
            expect(part.corners.undersideA.x + under * across).toBeCloseTo(part.corners.topA.x + top * across, 6)
          }
        }
      }),
    )
  })
})

describe('field brackets', () => {
  const placed = (field: number[], jointClear?: number) =>
    solved({ bottom: { type: 'slope', horizontal: 8 }, top: level(12), brackets: { field, jointClear } })

  it('are flagged nearer than 3 in to a knuckle along the rail, when nothing else was asked', () => {
    // 3 in along a rake of 3 in 4 is 2.4 in level.
    expect(placed([77.5, 77.7, 82.9, 83.1]).brackets).toMatchObject([
      { n: 1, part: 'A', tooCloseToJoint: false },
      { n: 2, part: 'A', tooCloseToJoint: true },
      { n: 3, part: 'B', tooCloseToJoint: true },
      { n: 4, part: 'B', tooCloseToJoint: false },
    ])
  })

  it('may stand on their limit, and as near as they like to a free end', () => {
    expect(placed([83, 92, -8]).brackets).toMatchObject([
      { tooCloseToJoint: false },
      { alongTopFromLowEnd: near(12), tooCloseToJoint: false },
      { alongTopFromLowEnd: near(0), tooCloseToJoint: false },
    ])
  })

  it('are off beyond the rail, with a warning that names them', () => {
    const { brackets, warnings } = placed([-8.1, 40, 92.1])
    expect(brackets).toMatchObject([
      { n: 1, off: true },
      { n: 2, part: 'A' },
      { n: 3, off: true },
    ])
    expect(brackets?.[0]).toEqual({ n: 1, off: true })
    expect(warnings.map(({ field }) => field)).toEqual(['brackets.field[0]', 'brackets.field[2]'])
  })

  it('are off on a volute, which is no part of ours', () => {
    expect(solved({ volutes: { bottom: 5 }, brackets: { field: [3.9, 4.1] } }).brackets).toMatchObject([
      { off: true },
      { part: 'A' },
    ])
  })
})
