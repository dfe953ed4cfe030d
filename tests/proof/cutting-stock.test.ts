import { describe, expect, it } from 'vitest'
import { cutList } from '@/lib/trade/cut-list/cut-list'
import { isRefusal } from '@/lib/trade/refusal'
import published from './published/cutting-stock.json'

const solved = (pieces: number[], stock: number, kerf: number) => {
  const list = cutList({ pieces, stock, kerf })
  if (isRefusal(list)) throw new Error(list.message)
  return list
}

const small = published.instances.filter(({ n }) => n <= 60)
const large = published.instances.filter(({ n }) => n > 60)

describe('published instances of up to 60 pieces, at their proved optimum', () => {
  it.each(small)('$id: $optimum sticks ($source)', ({ items, capacity, optimum }) => {
    expect(solved(items, capacity, 0)).toMatchObject({ sticks: optimum, bound: optimum, proved: true })
  })
})

describe('published instances of 120 pieces, at the optimum or one more', () => {
  it.each(large)('$id: $optimum sticks ($source)', ({ items, capacity, optimum }) => {
    const { sticks, bound } = solved(items, capacity, 0)
    expect(sticks).toBeGreaterThanOrEqual(optimum)
    expect(sticks).toBeLessThanOrEqual(optimum + 1)
    expect(bound).toBeLessThanOrEqual(optimum)
  })

  it('reaches the optimum itself on most of them', () => {
    const reached = large.filter(({ items, capacity, optimum }) => solved(items, capacity, 0).sticks === optimum)
    expect(reached.length).toBeGreaterThan(large.length / 2)
  })
})

describe('full sticks with a kerf between pieces, where longest-first needs one more', () => {
  it.each(published.constructed_with_kerf)('$id: $optimum_bars sticks', ({ pieces, stock, kerf, optimum_bars }) => {
    expect(solved(pieces, stock, kerf)).toMatchObject({ sticks: optimum_bars, proved: true })
  })
})
