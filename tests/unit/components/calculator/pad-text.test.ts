import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { pressKey, setFraction, type PadKey } from '@/components/calculator/pad-text'
import { readQuantity } from '@/lib/trade/quantity/read'

const pressAll = (start: string, keys: string) =>
  keys.split(' ').reduce((text, key) => pressKey(text, key as PadKey, false), start)

describe('the pad', () => {
  it('writes feet, inches and a fraction', () => {
    expect(setFraction(pressAll('', '6 ft 2'), 8, 16)).toBe("6' 2 1/2")
  })

  it('starts over with the first digit in a row freshly chosen', () => {
    expect(pressKey('33.7', '4', true)).toBe('4')
    expect(pressKey('33', '4', false)).toBe('334')
  })

  it('keeps the whole inches when only the fraction is tapped', () => {
    expect(setFraction('1 1/2', 3, 4)).toBe('1 3/4')
    expect(setFraction('1.5', 3, 8)).toBe('1 3/8')
    expect(setFraction('1 3/8', 0, 8)).toBe('1')
    expect(setFraction('3/8', 0, 8)).toBe('0')
  })

  it('puts a digit before a fraction that stands', () => {
    expect(pressKey('1/2', '3', false)).toBe('3 1/2')
  })

  it('takes back the fraction whole, then digit by digit, then the feet', () => {
    expect(pressAll("6' 12 1/2", 'back')).toBe("6' 12")
    expect(pressAll("6' 12 1/2", 'back back back')).toBe("6'")
    expect(pressAll("6' 12 1/2", 'back back back back')).toBe('6')
    expect(pressAll('-6', 'back back')).toBe('')
  })

  it('turns the sign and turns it back', () => {
    expect(pressAll('12', '-')).toBe('-12')
    expect(pressAll('12', '- -')).toBe('12')
  })

  it('takes one point only, and no feet of a broken number', () => {
    expect(pressAll('', '. 5 . 5')).toBe('0.55')
    expect(pressAll('5.5', 'ft')).toBe('5.5')
  })

  it('begins anew on what it could not have written', () => {
    expect(pressKey('atan(7/11)', '4', false)).toBe('4')
  })

  it('writes what the tape reads back', () => {
    const feet = fc.integer({ min: 1, max: 40 })
    const whole = fc.integer({ min: 0, max: 11 })
    fc.assert(
      fc.property(
        feet,
        whole,
        fc.integer({ min: 0, max: 63 }),
        fc.constantFrom(8, 16, 32, 64),
        (ft, inches, mark, den) => {
          const divisions = mark % den
          const keys = [...String(ft), 'ft', ...String(inches)].join(' ')
          const read = readQuantity(setFraction(pressAll('', keys), divisions, den), 'in')
          expect(read).toEqual({ value: ft * 12 + inches + divisions / den })
        },
      ),
    )
  })
})
