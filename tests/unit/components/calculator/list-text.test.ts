import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { lineOfItem, readList, writeList } from '@/components/calculator/list-text'

describe('lines of a list', () => {
  it('count pieces alike however the times sign is written', () => {
    for (const line of [
      '3 × 74 1/2',
      '3x74 1/2',
      '3 * 74 1/2',
      '3\t74 1/2',
      '3 pcs 74 1/2',
      '3 of 74 1/2',
      '3 X 74 1/2',
    ])
      expect(readList(line)).toEqual(['74 1/2', '74 1/2', '74 1/2'])
  })

  it('take a bare measure once, and never its whole inches for a count', () => {
    expect(readList("74 1/2\n6' 2 1/2\n\n60; 48")).toEqual(['74 1/2', "6' 2 1/2", '60', '48'])
  })

  it('keep what cannot be read as it is, for the sentence that says so', () => {
    expect(readList('2 × long')).toEqual(['long', 'long'])
  })

  it('find the line that a piece stands on', () => {
    expect(lineOfItem('2 × 60\n\n48\n3 × 12', 0)).toBe(1)
    expect(lineOfItem('2 × 60\n\n48\n3 × 12', 2)).toBe(3)
    expect(lineOfItem('2 × 60\n\n48\n3 × 12', 5)).toBe(4)
  })

  it('come back from the items they stand for', () => {
    const measure = fc.constantFrom('74 1/2', '60', "6'", '48.25', '1892 mm')
    fc.assert(
      fc.property(fc.array(measure, { maxLength: 60 }), (items) => {
        expect(readList(writeList(items))).toEqual(items)
      }),
    )
  })

  it('stop at a thousand, whatever the count says', () => {
    expect(readList('999 × 1\n999 × 2')).toHaveLength(1000)
  })
})
