import { describe, expect, it } from 'vitest'
import { besideFlow, rowsFlow, whole, type Flow } from '@/lib/print/pdf/flow'
import { openDocument } from '@/lib/print/pdf/document'
import { paginate } from '@/lib/print/pdf/paginate'
import type { Part, Setup } from '@/lib/print/pdf/set-line'

const setup: Setup = {
  doc: openDocument('', ''),
  reading: { precision: { tape: 16, dial: 0.25 }, preferences: { units: 'in', sawSquare: 0 } },
}
/** What was drawn, and how far down. */
const drawn: string[] = []
const part = (name: string, height: number): Part => ({ height, draw: (_x, y) => drawn.push(`${name} ${y}`) })
const rows = (name: string, count: number, height = 10): Flow =>
  rowsFlow({
    top: part(`${name} head`, 10),
    rows: Array.from({ length: count }, (_, i) => part(`${name}${i + 1}`, height)),
  })

function pages(flows: Flow[], room: { first: number; further: number }): string[][] {
  return paginate(setup, flows, 5, { ...room, width: 100 }).map((page) => {
    drawn.length = 0
    for (const { part: each, top } of page) each.draw(0, top)
    return [...drawn]
  })
}

describe('flows on pages', () => {
  it('stand under each other with the gap between them', () => {
    expect(pages([whole(part('a', 20)), whole(part('b', 30))], { first: 55, further: 99 })).toEqual([['a 0', 'b 25']])
  })

  it('go on to the next page whole where they cannot be parted', () => {
    expect(pages([whole(part('a', 20)), whole(part('b', 31))], { first: 55, further: 99 })).toEqual([['a 0'], ['b 0']])
  })

  it('part between rows, their head again over what is left', () => {
    expect(pages([rows('r', 5)], { first: 45, further: 99 })).toEqual([
      ['r head 0', 'r1 10', 'r2 20', 'r3 30'],
      ['r head 0', 'r4 10', 'r5 20'],
    ])
  })

  it('part for three rows at least, unless a fresh page holds no more', () => {
    expect(pages([rows('r', 5)], { first: 35, further: 99 })[0]).toEqual([])
    expect(pages([rows('r', 4, 50)], { first: 30, further: 70 }).map((page) => page.length)).toEqual([0, 2, 2, 2, 2])
  })

  it('part each for itself beside each other', () => {
    const beside = besideFlow([
      { flow: rows('l', 5), left: 0 },
      { flow: rows('r', 3), left: 50 },
    ])
    expect(pages([beside], { first: 45, further: 99 })).toEqual([
      ['l head 0', 'l1 10', 'l2 20', 'l3 30', 'r head 0', 'r1 10', 'r2 20', 'r3 30'],
      ['l head 0', 'l4 10', 'l5 20'],
    ])
  })

  it('are drawn smaller rather than cut off where no page holds them', () => {
    const [, page] = paginate(setup, [whole(part('a', 200))], 5, { first: 50, further: 100, width: 100 })
    expect(page?.[0]?.part.height).toBeCloseTo(100, 1)
  })
})
