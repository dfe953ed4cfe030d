import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { solveHandrail } from '@/lib/trade/rail/solve'
import type { HandrailInputs, HandrailOutputs } from '@/lib/trade/rail/types'
import { isRefusal } from '@/lib/trade/refusal'
import { bandUnder, type Spot } from '@/tests/support/offset-geometry'
import { railFields } from '@/tests/support/rail-fields'
import { railPath } from '@/tests/support/rail-path'

/**
 * The whole rail against a general geometry library (jsts) that knows nothing of miters and setbacks.
 *
 * Compared on random rails of one to three flights: the top line, built there by crossing lines from the field measure;
 * and the band of the section's depth under it, offset there with miter joins and square ends. Every corner of the band
 * must be a corner of a part, every corner of a part one of the band, and topEdge, underside and overall the distances
 * between the band's corners. Volutes, and the extra width that a return takes in plan, do not show in elevation and
 * are proved elsewhere.
 */
const within = 1e-6

const apart = (a: Spot, b: Spot) => Math.hypot(a.x - b.x, a.y - b.y)
const nearest = (to: Spot, among: readonly Spot[]) =>
  among.reduce((best, spot) => (apart(spot, to) < apart(best, to) ? spot : best))

/** A random rail that can be built; others are passed over. */
function compared(compare: (field: HandrailInputs, rail: HandrailOutputs) => void) {
  let count = 0
  fc.assert(
    fc.property(railFields, (field) => {
      const rail = solveHandrail(field, { tape: 16, dial: 0.25 })
      if (isRefusal(rail)) return
      count++
      compare(field, rail)
    }),
    { numRuns: 800, seed: 20 },
  )
  expect(count).toBeGreaterThan(400)
}

const cornersOf = ({ parts }: HandrailOutputs) =>
  parts.flatMap(({ corners }) => [corners.topA, corners.topB, corners.undersideA, corners.undersideB])

describe('the whole rail against offset geometry', () => {
  it('puts its ends and knuckles where the lines cross', () => {
    compared((field, { topLine }) => {
      const path = railPath(field)
      expect(topLine).toHaveLength(path.length)
      for (const [i, spot] of path.entries()) expect(apart(spot, topLine[i] ?? { x: NaN, y: NaN })).toBeLessThan(within)
    })
  })

  it('puts every corner of every part on a corner of the mitered band, and leaves none out', () => {
    compared((field, rail) => {
      const path = railPath(field)
      const band = bandUnder(path, field.section.depth)
      expect(band).toHaveLength(2 * path.length)
      const corners = cornersOf(rail)
      for (const corner of corners) expect(apart(corner, nearest(corner, band))).toBeLessThan(within)
      for (const spot of band) expect(apart(spot, nearest(spot, corners))).toBeLessThan(within)
    })
  })

  it('gives the edges and blanks that the band has', () => {
    compared((field, { parts }) => {
      const band = bandUnder(railPath(field), field.section.depth)
      for (const part of parts) {
        const { topA, topB, undersideA, undersideB } = part.corners
        const [ta, tb, ua, ub] = [topA, topB, undersideA, undersideB].map((corner) => nearest(corner, band)) as [
          Spot,
          Spot,
          Spot,
          Spot,
        ]
        const ahead = { x: (tb.x - ta.x) / apart(ta, tb), y: (tb.y - ta.y) / apart(ta, tb) }
        const along = [ta, tb, ua, ub].map(({ x, y }) => x * ahead.x + y * ahead.y)
        const plan = [part.endA, part.endB].filter(({ longPoint }) => longPoint === 'room side (plan)').length
        expect(part.topEdge).toBeCloseTo(apart(ta, tb), 6)
        expect(part.underside).toBeCloseTo(apart(ua, ub), 6)
        expect(part.overall - plan * field.section.width).toBeCloseTo(Math.max(...along) - Math.min(...along), 6)
      }
    })
  })
})
