import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { readAnswer } from '@/lib/exercises/read-answer'

const degrees = (ratio: number) => (Math.atan(ratio) * 180) / Math.PI

describe('an answer as a person types it', () => {
  it.each([
    [`6' 2 1/2`, 'in', 74.5],
    ['74-1/2"', 'in', 74.5],
    ['74.5', 'in', 74.5],
    ['1892 mm', 'in', 1892 / 25.4],
    ['16 1/4 deg', 'deg', 16.25],
    ['16¼°', 'deg', 16.25],
    ['16½', 'deg', 16.5],
    ["16° 15'", 'deg', 16.25],
    ['-3', 'deg', -3],
    ['atan(7/11)/2', 'deg', degrees(7 / 11) / 2],
    ['ATAN( 7 / 11 ) ÷ 2', 'deg', degrees(7 / 11) / 2],
    ['90 − atan(7/11)/2', 'deg', 90 - degrees(7 / 11) / 2],
    ['90-16.25', 'deg', 73.75],
    ['33.7/2', 'deg', 16.85],
    ['(34)/2', 'deg', 17],
    ['12*sqrt(7^2+11^2)', 'in', 12 * Math.hypot(7, 11)],
    ['1.5*tan(16.25)', 'in', 1.5 * Math.tan((16.25 * Math.PI) / 180)],
    ['asin(0.5) + acos(0.5) + sin(30) + cos(60)', 'deg', 91],
    ['abs(-4)-(+3)', 'deg', 1],
    ['2^3^2', 'in', 512],
    ['-2^2*2', 'in', -8],
  ] as const)('reads %s in %s', (typed, unit, value) => {
    expect(readAnswer(typed, unit)).toEqual({ value: expect.closeTo(value, 9) })
  })

  it.each([
    ['16,25', /comma/],
    ['1,892 mm', /comma/],
    ['atan(7,11)/2', /comma/],
    ['7/12', /inches in 12/],
    ['', /give a number/],
    ['constructor', /degrees/],
    ['constructor(1)', /A sum may use/],
    ['toString(1)', /A sum may use/],
    ['__proto__(1)', /A sum may use/],
    ['import("fs")', /A sum may use/],
    ['sin.constructor("return 1")()', /A sum may use/],
    ['sin(1).x', /A sum may use/],
    ['(1)[1]', /A sum may use/],
    ['a=(1)', /A sum may use/],
    ['f(x)=x', /A sum may use/],
    ['a=1', /degrees/],
    ['(pi)', /A sum may use/],
    ['(2 in)', /A sum may use/],
    ['(2)(3)', /A sum may use/],
    ['2*16 1/4', /A sum may use/],
    ['atan(½)', /A sum may use/],
    ['sin', /degrees/],
    ['sin()', /A sum may use/],
    ['sin+1', /A sum may use/],
    ['(16', /A sum may use/],
    ['(5)!', /A sum may use/],
    ['(1);(2)', /A sum may use/],
    ['random(1)', /A sum may use/],
    ['1e999', /degrees/],
    ['(1e999)', /no number as its answer/],
    ['1/(1-1)', /no number as its answer/],
    ['asin(2)', /no number as its answer/],
    ['9^9^9^9', /no number as its answer/],
    ['9'.repeat(400), /too long/],
    [`${'('.repeat(200)}1${')'.repeat(200)}`, /longer than a sum/],
    [`${'('.repeat(20)}1${')'.repeat(20)}`, /12 deep/],
    [`${'('.repeat(200)}1`, /longer than a sum/],
    ['4"', /that is a length/],
  ])('gives a sentence for %s', (typed, sentence) => {
    expect(readAnswer(typed, 'deg')).toEqual({ misread: expect.stringMatching(sentence) })
  })

  it('gives a finite number or a sentence for any text at all', () => {
    const signs = fc.string({ unit: fc.constantFrom(...'0123456789.+-*/^() sincotaqrbe\'"°½,=[]{}'), maxLength: 130 })
    fc.assert(
      fc.property(fc.oneof(signs, fc.string({ maxLength: 200 })), fc.constantFrom('in', 'deg'), (typed, unit) => {
        const read = readAnswer(typed, unit)
        if ('value' in read) expect(Number.isFinite(read.value)).toBe(true)
        else expect(read.misread).toMatch(/\S.*\.$/)
      }),
      { numRuns: 2000 },
    )
  })
})
