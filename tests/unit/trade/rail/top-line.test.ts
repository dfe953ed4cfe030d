import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { knuckles } from '@/lib/trade/knuckle'
import { isRefusal } from '@/lib/trade/refusal'
import { solved } from '@/tests/support/plain-rail'

const flight = { risers: 11, rise: 6, run: 8 }
const pitch = (Math.atan2(3, 4) * 180) / Math.PI
const near = (value: number) => expect.closeTo(value, 9)

describe('the top line', () => {
  it('puts equal heights plumb over the top nosing and one tread before the bottom one', () => {
    const { knuckles: found } = solved({ bottom: { type: 'level', length: 12 }, top: { type: 'level', length: 12 } })
    expect(found).toEqual({ fromTopNosing: near(0), fromBottomNosing: near(-8) })
  })

  it('says nothing of a knuckle at an end without a level run', () => {
    expect(solved({ bottom: { type: 'slope', horizontal: 8 } }).knuckles).toEqual({
      fromTopNosing: null,
      fromBottomNosing: null,
    })
  })

  it('agrees with the knuckle calculator on unequal heights', () => {
    const height = fc.integer({ min: 34 * 16, max: 38 * 16 }).map((n) => n / 16)
    fc.assert(
      fc.property(height, height, height, (rakeHeight, topLevelHeight, bottomLevelHeight) => {
        const expected = knuckles({ pitch, rakeHeight, topLevelHeight, bottomLevelHeight, firstRise: 6 })
        if (isRefusal(expected)) throw new Error(expected.message)
        const { knuckles: found } = solved({
          railHeight: rakeHeight,
          bottom: { type: 'level', length: 20, railHeight: bottomLevelHeight },
          top: { type: 'level', length: 20, railHeight: topLevelHeight },
        })
        expect(found.fromTopNosing).toBeCloseTo(expected.pastTopNosing, 9)
        expect(found.fromBottomNosing).toBeCloseTo(-(expected.beforeBottomNosing ?? NaN), 9)
      }),
    )
  })

  it('makes a landing rail one upper tread shorter than nosing to nosing', () => {
    const { parts } = solved({ flights: [flight, { risers: 6, rise: 5, run: 12 }], landings: [{ length: 50 }] })
    expect(parts[1]).toMatchObject({ kind: 'landing', slope: 0, topEdge: near(38) })
  })

  it('follows a landing that rises or falls away', () => {
    const on = (slopeInPerFt: number) => solved({ flights: [flight, flight], landings: [{ length: 48, slopeInPerFt }] })
    for (const slopeInPerFt of [0.25, -0.25]) {
      const { parts, joints, stair } = on(slopeInPerFt)
      const landing = (Math.atan2(slopeInPerFt, 12) * 180) / Math.PI
      expect(parts[1]?.slope).toBeCloseTo(landing, 9)
      expect(joints.map(({ bend }) => bend)).toEqual([near(pitch - landing), near(pitch - landing)])
      expect(joints.map(({ longPointFace }) => longPointFace)).toEqual(['top', 'underside'])
      const foot = stair.find(({ kind }) => kind === 'landing')?.points.at(-1)
      expect(foot).toEqual({ x: near(128), y: near(60 + 4 * slopeInPerFt + 6) })
    }
  })

  it('reads one flight alike however it was measured', () => {
    const ends = { bottom: { type: 'level', length: 12 }, top: { type: 'level', length: 12 } } as const
    const counted = solved(ends)
    for (const form of [
      { rake: 100, pitch, firstRise: 6 },
      { nosingRise: 60, nosingRun: 80, firstRise: 6 },
    ]) {
      const other = solved({ ...ends, flights: [form] })
      for (const [i, part] of other.parts.entries()) {
        expect(part.topEdge).toBeCloseTo(counted.parts[i]?.topEdge ?? NaN, 9)
        expect(part.overall).toBeCloseTo(counted.parts[i]?.overall ?? NaN, 9)
      }
    }
  })

  it('cuts square where a level run goes straight on from the rake', () => {
    const { joints, parts } = solved({ top: { type: 'level', length: 12, slopeInPerFt: 9 } })
    expect(joints).toMatchObject([
      { bend: 0, miter: 0, included: 180, longPointFace: 'none', sawSquareIs0: 0, dialGap: 0 },
    ])
    expect(parts[0]).toMatchObject({ cuts: 'square both ends', topEdge: near(100), endB: { longPoint: 'square' } })
    expect(parts[1]).toMatchObject({ topEdge: near(15), underside: near(15) })
  })

  it('lays stair and rail in one drawing: every piece begins where the last one ended', () => {
    const { stair, nosings, topLine } = solved({
      flights: [flight, flight],
      landings: [{ length: 48, slopeInPerFt: 0.25 }],
      top: { type: 'level', length: 12 },
    })
    expect(stair.map(({ kind }) => kind)).toEqual(['floor', 'flight', 'landing', 'flight', 'upper floor'])
    for (const [i, { points }] of stair.slice(1).entries()) expect(points[0]).toEqual(stair[i]?.points.at(-1))
    expect(nosings.map((points) => points.length)).toEqual([11, 11])
    expect(topLine[0]).toEqual({ x: 0, y: 36 })
  })
})
