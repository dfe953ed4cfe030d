import { describe, expect, it } from 'vitest'
import { drawsFrom, mulberry32 } from '@/lib/exercises/seed'

describe('draws from a seed', () => {
  it.each([
    // As widely printed for this generator.
    [0, [0.26642920868471265, 0.0003297457005828619, 0.2232720274478197]],
    [1, [0.6270739405881613, 0.002735721180215478, 0.5274470399599522]],
  ])('gives the known stream of seed %d', (seed, stream) => {
    const next = mulberry32(seed)
    expect(stream.map(() => next())).toEqual(stream)
  })

  it('reaches both ends of a range, and only whole steps of it', () => {
    const { step } = drawsFrom(7)
    const seen = new Set(Array.from({ length: 500 }, () => step(6.5, 7.75, 1 / 8)))
    expect([...seen].sort((a, b) => a - b)).toEqual([6.5, 6.625, 6.75, 6.875, 7, 7.125, 7.25, 7.375, 7.5, 7.625, 7.75])
  })

  it('picks every one of a list, and shuffles without losing one', () => {
    const { pick, shuffle } = drawsFrom(7)
    expect(new Set(Array.from({ length: 100 }, () => pick([0, 90])))).toEqual(new Set([0, 90]))
    const orders = new Set(Array.from({ length: 200 }, () => shuffle(['a', 'b', 'c']).join('')))
    expect([...orders].sort()).toEqual(['abc', 'acb', 'bac', 'bca', 'cab', 'cba'])
  })
})
