import { describe, expect, it } from 'vitest'
import { sheetToPdf } from '@/lib/print/pdf/sheet-to-pdf'
import { papers } from '@/lib/schemas/sheet'
import { beyond, emptyLetters, isPale, overlapping, rulerOf } from '@/tests/support/paper'
import { readPdf } from '@/tests/support/pdf-reader'
import { handbookRail, marksOf, quarryHead, sheetOfRail, towerRail } from '@/tests/support/rail-sheets'

describe.each(papers)('a rail of twelve flights on %s', (paper) => {
  it('goes on over pages that say which they are, every part once in the table, nothing cut off', async () => {
    const sheet = await sheetOfRail(towerRail(12))
    const bytes = await sheetToPdf(sheet, paper)
    expect(bytes.length).toBeLessThanOrEqual(200 * 1024)
    const { pages } = readPdf(bytes)
    expect(pages.length).toBeGreaterThan(1)
    const marks = marksOf(sheet)
    expect(marks).toHaveLength(24)
    const blanks = sheet.blocks.flatMap((block) =>
      block.kind === 'table' ? block.rows.flatMap((cells) => cells[4]?.under ?? []) : [],
    )
    const all = pages.map(({ text }) => text).join(' ')
    for (const mark of marks) expect(all.split(' ')).toContain(mark)
    for (const exact of blanks) expect(all).toContain(exact)
    for (const [i, page] of pages.entries()) {
      expect(page.text).toContain(`page ${i + 1} of ${pages.length}`)
      expect(page.text).toContain('Quarry Street walk-up')
      expect(beyond(page, 34)).toEqual([])
      expect(emptyLetters(page)).toEqual([])
    }
    // Heads of the table come again over the rows that are left.
    expect(pages[1]?.text).toContain('Mark Qty Top edge')
    expect(pages[0] && rulerOf(pages[0])?.length).toBeCloseTo(216, 2)
    expect(pages.slice(1).flatMap(overlapping)).toEqual([])
  })
})

describe('a sheet that another revision replaced', () => {
  const head = { ...quarryHead, kept: { sheet: 1, revision: 2, note: '', supersededBy: 3 } }

  it.each([handbookRail, towerRail(12)])('says so over and across every page', async (inputs) => {
    const { pages } = readPdf(await sheetToPdf(await sheetOfRail(inputs, { head }), 'letter'))
    for (const page of pages) {
      expect(page.text).toContain('SUPERSEDED: revision 3 stands in its place. DO NOT CUT FROM THIS SHEET.')
      expect(page.text).toContain('SUPERSEDED BY REVISION 3')
      // Pale and first, so that whatever stands on it is read.
      expect(isPale(page.letters[0]?.colour ?? '')).toBe(true)
      expect(page.letters[0]?.size).toBeGreaterThan(60)
      expect(beyond(page, 10)).toEqual([])
    }
  })

  it('is said of no sheet that stands', async () => {
    const { pages } = readPdf(await sheetToPdf(await sheetOfRail(handbookRail), 'letter'))
    expect(pages[0]?.text.toLowerCase()).not.toContain('superseded')
    expect(pages[0]?.letters.filter(({ colour }) => isPale(colour))).toEqual([])
  })
})
