import { describe, expect, it } from 'vitest'
import { draw } from '@/components/drawing/nosing-line'
import { blend } from '@/lib/drawing/blend'
import { compose } from '@/lib/drawing/compose'
import { nosingLine } from '@/lib/trade/nosing-line'
import { isRefusal } from '@/lib/trade/refusal'

function plateOf(risers: number, rise: number) {
  const given = { risers, rise, run: 11 }
  const solved = nosingLine(given)
  if (isRefusal(solved)) throw new Error('refused')
  return compose(draw(given, solved, { tape: 16, dial: 0.25, detail: 'full' }), { width: 760, height: 590 })
}

describe('blend', () => {
  const from = plateOf(5, 7)
  const to = plateOf(5, 7.25)

  it('begins where the drawing was and ends where it will be', () => {
    expect(blend(from, to, 0)?.marks[0]?.points).toEqual(from.marks[0]?.points)
    expect(blend(from, to, 1)?.marks[0]?.points).toEqual(to.marks[0]?.points)
  })

  it('is half way at a half', () => {
    const [a, b, middle] = [from, to, blend(from, to, 0.5)].map((plate) => plate?.marks[0]?.points.at(-1)?.y ?? NaN)
    expect(middle).toBeCloseTo(((a ?? NaN) + (b ?? NaN)) / 2, 6)
  })

  it('refuses two drawings that are not drawn alike', () => {
    expect(blend(from, plateOf(6, 7), 0.5)).toBeNull()
  })
})
