import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { markOf } from '@/lib/trade/rail/parts'
import { solveHandrail } from '@/lib/trade/rail/solve'
import type { HandrailInputs, HandrailOutputs } from '@/lib/trade/rail/types'
import { isRefusal } from '@/lib/trade/refusal'
import { solved } from '@/tests/support/plain-rail'
import { railFields } from '@/tests/support/rail-fields'

const precision = { tape: 16, dial: 0.25 }
const near = (value: number) => expect.closeTo(value, 9)

/** Runs a property over random rails that can be built, and makes sure that most can. */
function buildable(check: (rail: HandrailOutputs, field: HandrailInputs) => void) {
  let built = 0
  fc.assert(
    fc.property(railFields, (field) => {
      const rail = solveHandrail(field, precision)
      if (isRefusal(rail)) return
      built++
      check(rail, field)
    }),
    { numRuns: 200 },
  )
  expect(built).toBeGreaterThan(60)
}

/** Everything but the hand and what a hand turns. */
const withoutHand = ({ hand: _hand, returns, ...rest }: HandrailOutputs) => ({
  ...rest,
  returns: returns.map(({ turns: _turns, ...piece }) => piece),
})

describe('parts of the rail', () => {
  it('mirror without changing a length', () => {
    buildable((rail, field) => {
      const mirrored = solveHandrail({ ...field, hand: field.hand === 'L' ? 'R' : 'L' }, precision)
      if (isRefusal(mirrored)) throw new Error(mirrored.message)
      expect(mirrored.hand).not.toBe(rail.hand)
      expect(withoutHand(mirrored)).toEqual(withoutHand(rail))
      for (const [i, { turns }] of mirrored.returns.entries()) expect(turns).not.toBe(rail.returns[i]?.turns)
    })
  })

  it('add up, level, to the rail from end to end', () => {
    buildable(({ parts, topLine }) => {
      const across = parts.reduce((sum, { topEdge, slope }) => sum + topEdge * Math.cos((slope * Math.PI) / 180), 0)
      expect(across).toBeCloseTo((topLine.at(-1)?.x ?? NaN) - (topLine[0]?.x ?? NaN), 6)
    })
  })

  it('share one cut at every knuckle, long on one face of both', () => {
    buildable(({ parts, joints }) => {
      expect(joints).toHaveLength(parts.length - 1)
      for (const [i, { miter, longPointFace }] of joints.entries()) {
        const face = longPointFace === 'none' ? 'square' : longPointFace
        expect(parts[i]?.endB).toMatchObject({ exact: miter, longPoint: face })
        expect(parts[i + 1]?.endA).toMatchObject({ exact: miter, longPoint: face })
      }
    })
  })

  it('never answer with a number that is none', () => {
    buildable((rail) =>
      expect(JSON.stringify(rail)).not.toMatch(/:null(?<!"(fromTopNosing|fromBottomNosing|ok|value|stock)":null)/),
    )
  })

  it('run on from Z to AA', () => {
    expect([0, 25, 26, 27, 52].map(markOf)).toEqual(['A', 'Z', 'AA', 'AB', 'BA'])
  })
})

describe('free ends', () => {
  it('take both volutes off a single part and say so', () => {
    expect(solved({ volutes: { bottom: 5, top: 4.25 } }).parts).toMatchObject([
      { topEdge: near(90.75), overall: near(90.75), note: 'volute 5 taken off; volute 4.25 taken off' },
    ])
  })

  it('carry marks from the cut end of a volute', () => {
    const field = [20]
    const mark = (bottom: number) => solved({ volutes: { bottom }, brackets: { field } }).brackets?.[0]
    expect(mark(0)).toMatchObject({ alongTopFromLowEnd: near(25), alongUndersideFromLowEnd: near(25 - 1.5 * 0.75) })
    expect(mark(5)).toMatchObject({ alongTopFromLowEnd: near(20), alongUndersideFromLowEnd: near(20 - 1.5 * 0.75) })
  })

  it('add a rail width for each return, and keep the top edge to the wall side', () => {
    const toWall = { clearance: 2, gap: 0.25 }
    const { parts, returns } = solved({
      bottom: { type: 'none', return: toWall },
      top: { type: 'none', return: toWall },
    })
    expect(parts).toMatchObject([{ topEdge: near(100), overall: near(103), setbackA: 0, cuts: 'square both ends' }])
    expect(parts[0]).not.toHaveProperty('turn')
    expect(returns).toMatchObject([
      { end: 'bottom', longPoint: 3.25, shortPoint: 1.75, turns: 'right' },
      { end: 'top', longPoint: 3.25, shortPoint: 1.75, turns: 'right' },
    ])
    expect(returns.map(({ weld }) => weld)).toEqual([
      near(2 * (1.5 * Math.SQRT2 + 1.5)),
      near(2 * (1.5 * Math.SQRT2 + 1.5)),
    ])
  })

  it('turn the stock a quarter where a plan cut follows an elevation miter', () => {
    const { parts } = solved({ top: { type: 'level', length: 12, return: { clearance: 1.5 } } })
    expect(parts[0]).not.toHaveProperty('turn')
    expect(parts[1]).toMatchObject({ turn: 'turn the stock a quarter between cuts' })
  })

  it('weld the width, not the depth, longer at a return of rectangular stock', () => {
    const section = { shape: 'rect' as const, depth: 2, width: 1 }
    const { returns } = solved({ section, bottom: { type: 'none', return: { clearance: 1.5 } } })
    expect(returns[0]?.weld).toBeCloseTo(2 * (Math.SQRT2 + 2), 9)
  })
})

describe('what was not asked for', () => {
  it('is left out', () => {
    const rail = solved()
    for (const name of ['brackets', 'stock', 'weld', 'checks']) expect(rail).not.toHaveProperty(name)
    expect(rail).toMatchObject({ returns: [], closing: [], warnings: [] })
  })
})
