import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { densities, textStyle } from '@/lib/print/pdf/density'
import { openDocument } from '@/lib/print/pdf/document'
import { lineWidth, setLine, type Setup } from '@/lib/print/pdf/set-line'
import type { Line, Piece } from '@/lib/print/sheet/sheet'

const setup: Setup = {
  doc: openDocument('', ''),
  reading: { precision: { tape: 16, dial: 0.25 }, preferences: { units: 'in', sawSquare: 0 } },
}
const [density] = densities
if (!density) throw new Error('No density')
const style = textStyle(density)

const anyPiece: fc.Arbitrary<Piece> = fc.oneof(
  fc.string({ unit: 'grapheme', maxLength: 40 }),
  fc.string({ maxLength: 40 }).map((strong) => ({ strong })),
  fc.double({ min: 0, max: 300, noNaN: true }).map((tape) => ({ tape })),
  fc.constantFrom<Piece>({ dial: 16.25 }, { face: 'top' }, ' ', '____________', ' · '),
)
const anyLine: fc.Arbitrary<Line> = fc.array(anyPiece, { maxLength: 8 })

describe('setLine', () => {
  it('never sets a row wider than it is asked', () => {
    fc.assert(
      fc.property(anyLine, fc.integer({ min: 90, max: 400 }), (line, width) => {
        expect(setLine(setup, line, style, { width }).width).toBeLessThanOrEqual(width + 0.02)
      }),
    )
  })

  it('keeps on one row what is no wider than its place', () => {
    fc.assert(
      fc.property(anyLine, (line) => {
        const width = Math.max(90, lineWidth(setup, line, style))
        expect(setLine(setup, line, style, { width }).rows).toBeLessThanOrEqual(1)
      }),
    )
  })

  it('never takes more rows than it may, and says when it left some out', () => {
    fc.assert(
      fc.property(anyLine, fc.integer({ min: 1, max: 3 }), (line, most) => {
        const free = setLine(setup, line, style, { width: 100 })
        const held = setLine(setup, line, style, { width: 100, most })
        expect(held.rows).toBe(Math.min(free.rows, most))
        expect(held.cut).toBe(free.rows > most)
        expect(held.width).toBeLessThanOrEqual(100.02)
      }),
    )
  })

  it('parts words at blanks, and none at a blank that holds', () => {
    const rows = (text: string) => setLine(setup, [text], style, { width: 90 }).rows
    expect(rows('reading on a saw')).toBe(1)
    expect(rows('readings on a saw, then more')).toBe(2)
    // Eleven letters to a row: with a blank the second pair goes down whole.
    const held = setLine(setup, ['A–B\u00a0148.2° A–B\u00a0148.2°'], style, { width: 90 })
    expect(held.rows).toBe(2)
    expect(held.width).toBeCloseTo(lineWidth(setup, ['A–B\u00a0148.2°'], style), 3)
  })
})
