import type { Page } from 'playwright-core'
import { describe, expect, it } from 'vitest'
import { browsing } from '@/tests/support/browsing'
import { takeMeasure } from '@/tests/support/field-sheet'
import { readPdf } from '@/tests/support/pdf-reader'
import { expectClean, widths } from '@/tests/support/visit'

const { visit } = browsing()

/** The rows of a table with their cells, fractions read as text. */
const rows = (page: Page, table: string) =>
  page
    .locator(`${table} tbody tr`)
    .evaluateAll((found) =>
      found.map((row) => [...row.children].map((cell) => cell.textContent.replace(/\s+/g, ' ').trim())),
    )

/** How many sheets of paper the browser's own printing takes. */
async function printedPages(page: Page, format: 'Letter' | 'A4'): Promise<number> {
  return readPdf(await page.pdf({ format })).pages.length
}

describe.each(widths)('from a field measure to a cut sheet at %d px, without signing in', (width) => {
  it('draws the rail, names each cut, and prints one page', async () => {
    const visited = await visit(width)
    const { page, context } = visited
    await page.goto('/handbook/handrail')
    await takeMeasure(page)

    // Half of each bend by hand: atan(35/55) = 32.471°, landing -0.597°, atan(39/72) = 28.443°, level 0°.
    await expect.poll(async () => (await rows(page, '.parts-table')).length).toBe(4)
    const [rake, landing, upper, level] = await rows(page, '.parts-table')
    expect(rake?.[5]).toContain('16 1/2°')
    expect(rake?.[5]).toContain('long on top')
    expect(rake?.[5]).toContain('exactly 16.53°')
    expect(landing?.[4]).toContain('exactly 16.53°')
    expect(landing?.[5]).toContain('exactly 14.52°')
    expect(landing?.[5]).toContain('long underneath')
    expect(upper?.[5]).toContain('exactly 14.22°')
    expect(level?.[5]).toBe('square')
    const plate = page.getByRole('img', { name: 'The rail in elevation' })
    await plate.waitFor()
    expect(await plate.locator('path').count()).toBeGreaterThan(10)
    await expectClean(visited)

    await page.getByRole('link', { name: 'Print cut sheet' }).click()
    await page.waitForURL(/\/handbook\/handrail\/sheet\?m=/)
    const sheet = page.getByRole('article', { name: 'Sheet' })
    await sheet.waitFor()
    expect((await rows(page, '.printed-table')).map(([mark]) => mark?.[0])).toEqual(['A', 'B', 'C', 'D'])
    await page.getByText('Job, name and date on the sheet').click()
    await page.getByLabel('Job', { exact: true }).fill('Quarry Street walk-up')
    await expect.poll(() => sheet.innerText()).toContain('Quarry Street walk-up')
    await expectClean(visited)
    expect(await printedPages(page, 'Letter')).toBe(1)
    expect(await printedPages(page, 'A4')).toBe(1)

    const drawn = page.waitForResponse('**/api/calculators/handrail/sheet')
    const shown = context.waitForEvent('page')
    await page.getByRole('button', { name: 'PDF, Letter' }).click()
    expect((await drawn).status()).toBe(200)
    // The PDF stands in a window of its own, in front of this page.
    await (await shown).close()
    await page.bringToFront()
    await context.setOffline(true)
    await page.getByLabel('Measured by').fill('R. Bell')
    await expect.poll(() => sheet.innerText()).toContain('R. Bell')
    await context.close()
  })
})

describe('the cut sheet’s own page', () => {
  it('says where to begin when it is opened without a measure', async () => {
    const visited = await visit(390)
    await visited.page.goto('/handbook/handrail/sheet')
    await visited.page.getByRole('link', { name: 'Give a measure' }).waitFor()
    await expectClean(visited)
    await visited.context.close()
  })

  it('says which measures are off, and leads back to them', async () => {
    const visited = await visit(1440)
    const { page } = visited
    await page.goto('/handbook/handrail/sheet?m=r~L~36!s~round~1.66!b~none!t~35~steep!u~none')
    await page.getByRole('link', { name: 'Mend the measure' }).waitFor()
    expect(await page.getByRole('alert').first().innerText()).toContain('Run, nosing to nosing')
    await expectClean(visited)
    await visited.context.close()
  })
})
