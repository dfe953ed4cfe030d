import { describe, expect, it } from 'vitest'
import { closingText, endText, sectionText, slopeText, sticksText, heightText } from '@/lib/trade/rail/words'

describe('words of a rail', () => {
  it('says whether fewer sticks could do', () => {
    expect(sticksText({ sticks: 1, bound: 1, proved: true })).toBe('1 stick, and no fewer can do')
    expect(sticksText({ sticks: 6, bound: 5, proved: false })).toBe('6 sticks; 5 not ruled out')
  })

  it('says by how much three tapes do not close', () => {
    expect(closingText({ flight: 1, error: -0.375, verdict: 'measure again' }, 16)).toBe(
      'Measure again: the three tapes do not close by 3/8".',
    )
    expect(closingText({ flight: 1, error: 0.01, verdict: 'agree' }, 16)).toBe('The three tapes close.')
  })

  it.each([
    [0, 'saw 16 1/4°, long on top'],
    [90, 'saw 73 3/4°, long on top'],
  ] as const)('reads the saw as it is marked: square at %i', (sawSquare, said) => {
    expect(endText({ saw: 16.25, exact: 16.3, longPoint: 'top' }, 0.25, sawSquare)).toBe(said)
  })

  it('names a section as it is ordered', () => {
    expect(sectionText({ shape: 'round', depth: 1.66, width: 1.66 }, 16)).toBe('1.66 in round')
    expect(sectionText({ shape: 'rect', depth: 2, width: 1.5 }, 16)).toBe('2" × 1 1/2" rectangular')
  })

  it('says a height in inches alone', () => {
    expect(heightText(36.5, 16, 'in')).toBe('36 1/2"')
    expect(heightText(36, 16, 'mm')).toBe('914 mm')
  })

  it('sets a true minus before a fall', () => {
    expect(slopeText(-0.6)).toBe('−0.6°')
  })
})
