import { describe, expect, it } from 'vitest'
import { readQuantity } from '@/lib/trade/quantity/read'

const read = (text: string | number, unit: string) => {
  const result = readQuantity(text, unit)
  return 'value' in result ? result.value : result.misread
}

describe('a length as people write it', () => {
  it.each([
    [`6' 2 1/2`, 74.5],
    [`6' 2 1/2"`, 74.5],
    [`6'-2-1/2"`, 74.5],
    [`6'2-1/2"`, 74.5],
    ['6′ 2 ½″', 74.5],
    ['6’ 2½”', 74.5],
    ['6ft 2.5in', 74.5],
    ['6 feet 2 inches', 74],
    [`6'`, 72],
    [`1.5'`, 18],
    [`0'-6"`, 6],
    [`12'-0 1/16"`, 144.0625],
    [`6'2''`, 74],
    ['6 \' 2 "', 74],
    [`-6' 2"`, -74],
    ['– 1/4', -0.25],
    ['25.4 mm', 1],
    ['-2.54 cm', -1],
    ['74-1/2 in', 74.5],
    ['74.5', 74.5],
    ['.5', 0.5],
    ['2½', 2.5],
    ['2⅝"', 2.625],
    ['5/4', 1.25],
    ['7⁄16', 0.4375],
    ['1892 mm', 1892 / 25.4],
    ['189.2cm', 189.2 / 2.54],
    ['1.892 m', 1892 / 25.4],
    ['-3 1/2', -3.5],
    ['−4"', -4],
    ['+7', 7],
    ['3′-0¼″', 36.25],
    ['\u00a074\u202f1/2 ', 74.5],
    ['７４.５', 74.5],
    ['74\u200b.5', 74.5],
  ])('%s', (text, inches) => {
    expect(read(text, 'in')).toBeCloseTo(inches, 12)
  })

  it('takes a bare number as inches', () => {
    expect(read(74.5, 'in')).toBe(74.5)
  })
})

describe('a length that could mean two things, or none', () => {
  it.each([
    [`5' 14"`, 'from 0 to under 12'],
    ['6 2', 'could be feet and inches'],
    ['1,5', 'comma'],
    ['1,892', 'comma'],
    [`1.5' 3"`, 'two things'],
    [`5'3'`, 'inches after the feet'],
    ['32 deg', 'that is an angle'],
    ["32° 30'", 'that is an angle'],
    ['1 1/2 mm', 'decimal'],
    ['½ mm', 'decimal'],
    ['mm', 'decimal'],
    [`5' 12"`, 'from 0 to under 12'],
    ['1 000', 'could be feet and inches'],
    [`6'-`, 'inches after the feet'],
    ['3 ft 4 ft', 'inches after the feet'],
    ['3/0', 'as a tape reads'],
    ['7/', 'as a tape reads'],
    ['1/2/3', 'as a tape reads'],
    ['2 5/4', 'as a tape reads'],
    ['--5', 'as a tape reads'],
    ['6.2.3', 'as a tape reads'],
    ['0x10', 'as a tape reads'],
    ['1e3', 'as a tape reads'],
    ['1e400', 'as a tape reads'],
    ['NaN', 'as a tape reads'],
    ['Infinity', 'as a tape reads'],
    ['about six', 'as a tape reads'],
    ['5-3', 'as a tape reads'],
    ['6-2-1/2', 'as a tape reads'],
    ['+-5', 'as a tape reads'],
    ['5-', 'as a tape reads'],
    ['6"2', 'as a tape reads'],
    ['12 in 3', 'as a tape reads'],
    ['9/16ths', 'as a tape reads'],
    ['٣', 'as a tape reads'],
    ['in', 'as a tape reads'],
    ['"', 'as a tape reads'],
    ['', 'give a number'],
    ['   ', 'give a number'],
    ['9'.repeat(61), 'too long'],
  ])('%s', (text, sentence) => {
    expect(read(text, 'in')).toContain(sentence)
  })

  it.each([NaN, Infinity, -Infinity])('the number %s', (value) => {
    expect(read(value, 'in')).toContain('can be measured')
  })
})

describe('an angle', () => {
  it.each([
    ['32.5', 32.5],
    ['32.5 deg', 32.5],
    ['32.5°', 32.5],
    ['16 1/4 degrees', 16.25],
    ['16¼°', 16.25],
    [`32° 30'`, 32.5],
    ['32° 30′ 36″', 32.51],
    ['-3', -3],
  ])('%s', (text, degrees) => {
    expect(read(text, 'deg')).toBeCloseTo(degrees, 12)
  })

  it.each([
    ['10 in', 'that is a length'],
    ['10 mm', 'that is a length'],
    [`32° 75'`, 'under 60'],
    ["12'", 'that is a length'],
    ["32° 60'", 'under 60'],
    ['32° 5′ 60″', 'under 60'],
    ['7/12', 'inches in 12 of run or a part of a degree'],
    ['6.5 / 12', 'inches in 12 of run or a part of a degree'],
    ['32 30', 'Write degrees'],
    ['32°30', 'Write degrees'],
    ['0.5 rad', 'Write degrees'],
    ['1:12', 'Write degrees'],
    ['10%', 'Write degrees'],
    ['steep', 'Write degrees'],
  ])('refuses %s', (text, sentence) => {
    expect(read(text, 'deg')).toContain(sentence)
  })
})

describe('a slope', () => {
  it.each([
    ['1/4', 0.25],
    ['1/4 in/ft', 0.25],
    ['1/4"/ft', 0.25],
    ['1/4 in per foot', 0.25],
    ['-1/8', -0.125],
    ['2%', 0.24],
    ['1:48', 0.25],
  ])('%s', (text, perFoot) => {
    expect(read(text, 'in/ft')).toBeCloseTo(perFoot, 12)
  })

  it.each([
    ['1.2 deg', 'that is an angle'],
    ['1:0', 'inches per foot'],
    ['1:2:3', 'inches per foot'],
    ['5 mm', 'inches per foot'],
    ['1/4 in/m', 'inches per foot'],
  ])('refuses %s', (text, sentence) => {
    expect(read(text, 'in/ft')).toContain(sentence)
  })
})

describe('a number in a unit that is known', () => {
  it.each([
    ['25 %', '%', 25],
    ['3 lb/h', 'lb/h', 3],
    ['0.02 sq in', 'in2', 0.02],
    ['0.93', 'ratio', 0.93],
    ['13', 'none', 13],
  ])('%s', (text, unit, value) => {
    expect(read(text, unit)).toBe(value)
  })
})
