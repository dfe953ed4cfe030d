import { describe, expect, it } from 'vitest'
import { standing } from '@/lib/exercises/standing'

/** Draws as letters: g good at once, m missed once, M twice, N three times, r missed then right, - not tried. */
const drawn = (letters: string) => [...letters].map((letter) => ({ tries: triesOf[letter] ?? [] }))

const triesOf: Record<string, boolean[]> = {
  g: [true],
  m: [false],
  M: [false, false],
  N: [false, false, false],
  r: [false, true],
  '-': [],
}

describe('where somebody stands in an exercise', () => {
  it.each([
    ['', false],
    ['ggg', false],
    ['gggg', true],
    ['gggmg', true],
    ['mgggg', true],
    ['ggmmgg', false],
    ['ggmgmg', false],
    ['gmgmggg', true],
    ['gggr', false],
    ['gggrg', true],
    ['ggg-g', true],
    ['-----', false],
    ['ggggmmmmm', true],
    ['rrrrr', false],
    ['mggmgggmm', true],
    ['gmgmgmgmgm', false],
  ])('after %s passed is %s', (letters, passed) => {
    expect(standing(drawn(letters)).passed).toBe(passed)
  })

  it.each([
    ['-', true],
    ['g-', true],
    ['gm-', false],
    ['ggg', false],
  ])('on the last draw of %s the calculator is folded away: %s', (letters, calculatorFolded) => {
    expect(standing(drawn(letters)).calculatorFolded).toBe(calculatorFolded)
  })

  it.each([
    ['m', false, false],
    ['r', false, false],
    ['M', true, false],
    ['N', true, true],
    ['N-', false, false],
    ['mm', false, false],
  ])('after %s a twin is offered: %s, noted: %s', (letters, offersTwin, noted) => {
    expect(standing(drawn(letters))).toMatchObject({ offersTwin, noted })
  })
})
