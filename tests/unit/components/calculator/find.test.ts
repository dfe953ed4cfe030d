import { describe, expect, it } from 'vitest'
import { findCalculators, slipsBetween } from '@/components/calculator/find'
import { allCalculators } from '@/lib/calculators'

const all = await allCalculators()
const first = (query: string) => findCalculators(query, all)[0]?.id

describe('search in the handbook', () => {
  it.each([
    ['miter', 'miter'],
    ['mitre', 'miter'],
    ['mtier', 'miter'],
    ['pich', 'pitch'],
    ['nosing', 'nosing-line'],
    ['handrale', 'handrail'],
    ['cut list', 'cut-list'],
  ])('finds for “%s” the page %s', (query, id) => {
    expect(first(query)).toBe(id)
  })

  it('finds every calculator by its name and by whatever else it is called', () => {
    for (const { id, name, alsoCalled } of all)
      for (const word of [name, ...alsoCalled])
        expect(
          findCalculators(word, all).map((each) => each.id),
          word,
        ).toContain(id)
  })

  it('finds nothing where nothing fits, and all for an empty query', () => {
    expect(findCalculators('zebra', all)).toEqual([])
    expect(findCalculators('  ', all)).toHaveLength(all.length)
  })

  it('counts slips: a letter more, a letter less, another letter, two swapped', () => {
    expect([
      slipsBetween('rake', 'rakes'),
      slipsBetween('rake', 'rke'),
      slipsBetween('rake', 'rape'),
      slipsBetween('rake', 'arke'),
    ]).toEqual([1, 1, 1, 1])
    expect(slipsBetween('rake', 'bevel')).toBeGreaterThan(3)
  })
})
