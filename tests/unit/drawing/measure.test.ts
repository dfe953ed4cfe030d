import { fileURLToPath } from 'node:url'
import PDFDocument from 'pdfkit'
import { describe, expect, it } from 'vitest'
import { advance, layText } from '@/lib/drawing/measure'
import { degrees, dial, inchesOnly, length, plain, word } from '@/lib/drawing/text'

const show = { tape: 16, dial: 0.25, detail: 'full' } as const
const file = (name: string) => fileURLToPath(new URL(`../../../fonts/${name}`, import.meta.url))
const fonts = {
  mono: file('atkinson-hyperlegible-mono-latin-wght-normal.woff2'),
  word: file('barlow-condensed-latin-600-normal.woff2'),
}

/** What the font itself says, letter by letter: labels are set without kerning. */
function fontWidth(face: 'mono' | 'word', text: string): number {
  const doc = new PDFDocument()
  doc.font(fonts[face]).fontSize(1000)
  return [...text].reduce((sum, letter) => sum + doc.widthOfString(letter), 0)
}

describe('widths of text', () => {
  it.each([
    ['mono', '6-11 3/16°'],
    ['word', 'half the bend, both pieces'],
    ['word', 'UP ′ ″ ⁄ ’'],
  ] as const)('agree with the font: %s “%s”', (face, text) => {
    expect(advance(face, text)).toBeCloseTo(fontWidth(face, text), -1)
  })

  it('never take a letter unknown to the table for a narrow one', () => {
    expect(advance('word', '中')).toBeGreaterThanOrEqual(advance('word', 'W'))
  })

  it('place every run inside the width and height that are claimed', () => {
    const text = [[...length(78.4375, show), word(' top edge')], dial(16.25, show)]
    const laid = layText(text, 'number', 1, 'middle')
    for (const run of laid.runs) {
      expect(run.x).toBeGreaterThanOrEqual(0)
      expect(run.x + run.width).toBeLessThanOrEqual(laid.width + 0.01)
      expect(run.y - run.size * 0.7).toBeGreaterThanOrEqual(-laid.ascent - 0.01)
      expect(run.y).toBeLessThanOrEqual(laid.descent)
    }
  })
})

describe('a length on a label', () => {
  it.each([
    [78.4375, '6′-6 7/16″'],
    [36, '3′-0″'],
    [0.4375, '7/16″'],
    [12.03125, '1′-0 1/16″'],
    [0, '0″'],
    [-1.5, '−1 1/2″'],
    [11.99, '1′-0″'],
  ])('%f in reads %s', (inches, text) => {
    expect(plain([length(inches, show)])).toBe(text)
  })

  it('is in inches alone where the trade says so', () => {
    expect(plain([inchesOnly(36, show)])).toBe('36″')
    expect(plain([inchesOnly(34.5, show)])).toBe('34 1/2″')
  })

  it('is in millimetres for a metric reader', () => {
    expect(plain([length(10, { ...show, metric: true })])).toBe('254 mm')
  })
})

describe('an angle on a label', () => {
  it.each([
    [16.25, '16 1/4°'],
    [16, '16°'],
    [-3.5, '−3 1/2°'],
  ])('%f° on the dial reads %s', (value, text) => {
    expect(plain([dial(value, show)])).toBe(text)
  })

  it('drops trailing zeros and keeps its sign', () => {
    expect(plain([degrees(33.7, 2)])).toBe('33.7°')
    expect(plain([degrees(-4, 1)])).toBe('−4°')
  })
})
