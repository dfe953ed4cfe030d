import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { dialParts, showDial } from '@/lib/trade/quantity/dial'
import { showMetric } from '@/lib/trade/quantity/metric'
import { readQuantity } from '@/lib/trade/quantity/read'
import { showTape, tapeParts } from '@/lib/trade/quantity/tape'

const lengths = fc.double({ min: -12_000, max: 12_000, noNaN: true })
const angles = fc.double({ min: -360, max: 360, noNaN: true })
/** Nearest multiple of 1/den; halves go away from zero, as a tape is read. */
const nearest = (value: number, den: number) => (Math.sign(value) * Math.round(Math.abs(value) * den)) / den

describe('a tape', () => {
  it.each([
    [143.3527, 16, `11'-11 3/8"`],
    [74.5, 16, `6'-2 1/2"`],
    [0.4375, 16, `7/16"`],
    [11.375, 16, `11 3/8"`],
    [0, 16, `0"`],
    [72, 16, `6'-0"`],
    [72.0625, 16, `6'-0 1/16"`],
    [-24, 16, `-2'-0"`],
    [-0.5, 16, `-1/2"`],
    [-0.01, 16, `0"`],
    [11.99, 16, `1'-0"`],
    [0.109, 64, `7/64"`],
    [0.109, 8, `1/8"`],
  ])('shows %d to 1/%d as %s', (inches, den, text) => {
    expect(showTape(inches, den)).toBe(text)
  })

  it.each([8, 16, 32, 64])('reads back what it shows, to 1/%d in', (den) => {
    fc.assert(
      fc.property(lengths, (inches) => {
        expect(readQuantity(showTape(inches, den), 'in')).toEqual({ value: nearest(inches, den) + 0 })
      }),
      { numRuns: 500 },
    )
  })

  it('reduces its fraction and keeps inches under a foot', () => {
    fc.assert(
      fc.property(lengths, fc.constantFrom(8, 16, 32, 64), (length, den) => {
        const { negative, feet, inches, numerator, denominator } = tapeParts(length, den)
        const size = feet * 12 + inches + numerator / denominator
        expect(negative ? -size : size).toBe(nearest(length, den) + 0)
        expect(inches).toBeLessThan(12)
        expect(numerator === 0 ? denominator === 1 : numerator % 2 === 1 && numerator < denominator).toBe(true)
      }),
    )
  })
})

describe('a dial', () => {
  it.each([
    [16.2356, 0.25, '16 1/4°'],
    [16.2356, 0.5, '16°'],
    [16.5, 1, '17°'],
    [0.25, 0.25, '1/4°'],
    [-3.5, 0.5, '-3 1/2°'],
    [0, 0.25, '0°'],
  ])('shows %d at steps of %d as %s', (degrees, step, text) => {
    expect(showDial(degrees, step)).toBe(text)
  })

  it.each([0.25, 0.5, 1])('reads back what it shows, at steps of %d', (step) => {
    fc.assert(
      fc.property(angles, (degrees) => {
        const value = nearest(degrees, 1 / step) + 0
        expect(readQuantity(showDial(degrees, step), 'deg')).toEqual({ value })
        const { negative, whole, numerator, denominator } = dialParts(degrees, step)
        expect((negative ? -1 : 1) * (whole + numerator / denominator) + 0).toBe(value)
      }),
    )
  })
})

describe('metric', () => {
  it.each([
    [74.488, '1892 mm'],
    [1, '25 mm'],
    [1 / 16, '1.6 mm'],
    [0, '0 mm'],
    [-0.0001, '0 mm'],
    [-10, '-254 mm'],
  ])('shows %d in as %s', (inches, text) => {
    expect(showMetric(inches)).toBe(text)
  })
})
