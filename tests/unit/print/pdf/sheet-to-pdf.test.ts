import { describe, expect, it } from 'vitest'
import { sheetToPdf } from '@/lib/print/pdf/sheet-to-pdf'
import { papers } from '@/lib/schemas/sheet'
import { examplesOf } from '@/tests/support/examples'
import { beyond, emptyLetters, overlapping, rulerOf } from '@/tests/support/paper'
import { readPdf } from '@/tests/support/pdf-reader'
import { handbookRail, marksOf, sheetOfRail } from '@/tests/support/rail-sheets'

const largest = 200 * 1024
/** Of a millimetre, points. */
const twentieth = (0.05 / 25.4) * 72
const sizes = { letter: [612, 792], a4: [595.28, 841.89] } as const

describe.each(papers)('the cut sheet on %s', (paper) => {
  const drawn = async (...asked: Parameters<typeof sheetOfRail>) =>
    readPdf(await sheetToPdf(await sheetOfRail(...asked), paper))

  it.each(examplesOf('handrail'))('is one whole page for $id', async ({ inputs }) => {
    const sheet = await sheetOfRail(inputs)
    const bytes = await sheetToPdf(sheet, paper)
    expect(bytes.length).toBeLessThanOrEqual(largest)
    const { pages } = readPdf(bytes)
    expect(pages).toHaveLength(1)
    for (const page of pages) {
      expect([page.width, page.height]).toEqual(sizes[paper])
      // Printers leave a quarter of an inch white; a line's own width may reach past its middle.
      expect(beyond(page, 34)).toEqual([])
      expect(emptyLetters(page)).toEqual([])
      expect(overlapping(page)).toEqual([])
      expect(marksOf(sheet).length).toBeGreaterThan(0)
      for (const mark of marksOf(sheet)) expect(page.text.split(' ')).toContain(mark)
      expect(page.text).toContain('R. Bell')
      expect(page.text).toContain('DO NOT CUT')
    }
  })

  it('has a ruler of three inches to a twentieth of a millimetre, a tick each inch', async () => {
    const { pages } = await drawn(handbookRail)
    const [page] = pages
    const ruler = page && rulerOf(page)
    expect(page?.unit).toBe(1)
    expect(ruler?.level).toBe(true)
    expect(Math.abs((ruler?.length ?? 0) - 216)).toBeLessThan(twentieth)
    expect(ruler?.ticks).toHaveLength(4)
    for (const [inch, at] of ruler?.ticks.entries() ?? []) expect(Math.abs(at - inch * 72)).toBeLessThan(twentieth)
    expect(page?.text).toContain('print check: 3 in exactly')
  })

  it.each(['L', 'R'])('says the hand %s in a letter an inch high', async (hand) => {
    const { pages } = await drawn({ ...handbookRail, hand })
    const letters = pages.flatMap((page) => page.letters).filter(({ size }) => size > 60)
    expect(letters.map(({ text }) => text)).toEqual([hand])
    expect(Math.abs((letters[0]?.top ?? 0) - 72)).toBeLessThan(twentieth)
    expect(pages[0]?.text).toContain('hand, going UP')
  })

  it('sets lengths as fractions that are copied as the tape says them', async () => {
    const { pages } = await drawn(handbookRail)
    // Rake of the lower flight from the tapes: 65 3/16 less nothing at its low end, an extension of 11 in at 32.47°: 78.230.
    expect(pages[0]?.text).toContain('6′-6 1/4″ 78.230')
    expect(pages[0]?.letters.some(({ text }) => text === '⁄')).toBe(true)
    expect(pages[0]?.text).toContain('16 1/2°')
  })

  it('reads millimetres first where the reader does, the tape under them', async () => {
    const { pages } = await drawn(handbookRail, { preferences: { units: 'mm' } })
    expect(pages).toHaveLength(1)
    expect(pages[0]?.text).toContain(`1987 mm 6'-6 1/4" · 78.230`)
    expect(pages.map(overlapping)).toEqual([[]])
  })

  it('reads the saw from 90 where the reader’s saw does', async () => {
    const { pages } = await drawn(handbookRail, { preferences: { sawSquare: 90 } })
    expect(pages[0]?.text).toContain('90 = square')
    expect(pages[0]?.text).toContain('73 1/2°')
  })
})

describe('the file of a sheet', () => {
  it('says what it is, and is the same whenever it is drawn', async () => {
    const sheet = await sheetOfRail(handbookRail)
    const bytes = await sheetToPdf(sheet, 'letter')
    expect(readPdf(bytes).info).toMatchObject({ Title: 'Quarry Street walk-up', Subject: sheet.under })
    expect((await sheetToPdf(sheet, 'letter')).equals(bytes)).toBe(true)
  })

  it('draws the welding symbol with its words where parts are joined, and none where the rail is one piece', async () => {
    const joined = readPdf(await sheetToPdf(await sheetOfRail(handbookRail), 'letter'))
    expect(joined.pages[0]?.text).toContain('shop procedure')
    const [{ inputs } = { inputs: {} }] = examplesOf('handrail')
    const single = readPdf(await sheetToPdf(await sheetOfRail(inputs), 'letter'))
    expect(single.pages[0]?.text).not.toContain('shop procedure')
  })
})
