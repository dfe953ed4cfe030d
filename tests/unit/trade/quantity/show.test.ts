import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { dialParts, showDial } from '@/lib/trade/quantity/dial'
import { showMetric } from '@/lib/trade/quantity/metric'
import { readQuantity } from '@/lib/trade/quantity/read'
import { showTape, tapeParts } from '@/lib/trade/quantity/tape'

const back = (text: string, unit: string) => {
  const read = readQuantity(text, unit)
  return 'value' in read ? read.value : NaN
}

describe('a length on the tape', () => {
  it.each([
    [143.3527, 16, `11'-11 3/8"`],
    [74.5, 16, `6'-2 1/2"`],
    [11.375, 16, '11 3/8"'],
    [0.4375, 16, '7/16"'],
    [0, 16, '0"'],
    [12, 16, `1'-0"`],
    [12.25, 16, `1'-0 1/4"`],
    [11.99, 16, `1'-0"`],
    [-24, 16, `-2'-0"`],
    [-0.01, 16, '0"'],
    [0.03125, 16, '1/16"'],
  ])('%d in by %d', (inches, den, text) => {
    expect(showTape(inches, den)).toBe(text)
  })

  it('reads back to the nearest mark, whatever the tape', () => {
    const length = fc.double({ min: -2000, max: 2000, noNaN: true })
    fc.assert(
      fc.property(length, fc.constantFrom(8, 16, 32, 64), (inches, den) => {
        const mark = (Math.sign(inches) * Math.round(Math.abs(inches) * den)) / den
        expect(back(showTape(inches, den), 'in')).toBeCloseTo(mark, 9)
      }),
    )
  })

  it('splits into feet under 12 in, and a fraction in lowest terms', () => {
    expect(tapeParts(78.25, 16)).toEqual({ negative: false, feet: 6, inches: 6, numerator: 1, denominator: 4 })
  })
})

describe('an angle on the dial', () => {
  it.each([
    [16.2356, 0.25, '16 1/4°'],
    [16.2356, 0.5, '16°'],
    [16.2356, 1, '16°'],
    [0.1, 0.25, '0°'],
    [-0.6, 0.5, '-1/2°'],
  ])('%d by %d', (degrees, step, text) => {
    expect(showDial(degrees, step)).toBe(text)
  })

  it('reads back to the nearest mark, whatever the dial', () => {
    fc.assert(
      fc.property(fc.double({ min: -90, max: 90, noNaN: true }), fc.constantFrom(0.25, 0.5, 1), (degrees, step) => {
        const mark = Math.sign(degrees) * Math.round(Math.abs(degrees) / step) * step
        expect(back(showDial(degrees, step), 'deg')).toBeCloseTo(mark, 9)
      }),
    )
  })

  it('has no fraction where the mark is whole', () => {
    expect(dialParts(45, 0.25)).toEqual({ negative: false, whole: 45, numerator: 0, denominator: 1 })
  })
})

it('shows millimetres whole, and tenths where a millimetre is coarse', () => {
  expect(showMetric(74.5)).toBe('1892 mm')
  expect(showMetric(1 / 16)).toBe('1.6 mm')
  expect(showMetric(0)).toBe('0 mm')
})
