import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { ellipsePerimeter, weldLength } from '@/lib/trade/weld-length'

/** Perimeter by walking round the ellipse in ten thousand chords: a second route to the same length. */
function walked(long: number, short: number): number {
  const steps = 10_000
  const at = (i: number) => ({
    x: (long / 2) * Math.cos((2 * Math.PI * i) / steps),
    y: (short / 2) * Math.sin((2 * Math.PI * i) / steps),
  })
  return Array.from({ length: steps }, (_, i) => Math.hypot(at(i + 1).x - at(i).x, at(i + 1).y - at(i).y)).reduce(
    (a, b) => a + b,
    0,
  )
}

describe('weld around a mitered section', () => {
  it('is the circle where nothing is mitered', () => {
    expect(weldLength({ shape: 'round', outside: 2, miter: 0 })).toEqual({ perimeter: expect.closeTo(2 * Math.PI, 12) })
  })

  it('walks round the same ellipse', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 1, max: 4, noNaN: true }),
        fc.double({ min: 1, max: 4, noNaN: true }),
        (long, short) => {
          expect(Math.abs(ellipsePerimeter(long, short) / walked(long, short) - 1)).toBeLessThan(1e-6)
        },
      ),
      { numRuns: 30 },
    )
  })

  it('lengthens the depth of a rectangle only: 60° doubles it', () => {
    expect(weldLength({ shape: 'rect', width: 1, depth: 2, miter: 60 })).toEqual({ perimeter: expect.closeTo(10, 9) })
  })

  it.each([
    ['outside', { shape: 'round' as const, miter: 10 }],
    ['width', { shape: 'rect' as const, depth: 1, miter: 10 }],
    ['depth', { shape: 'rect' as const, width: 1, depth: 0, miter: 10 }],
    ['miter', { shape: 'round' as const, outside: 1, miter: 90 }],
  ])('refuses a missing or impossible %s', (field, given) => {
    expect(weldLength(given)).toMatchObject({ refused: true, field })
  })
})
