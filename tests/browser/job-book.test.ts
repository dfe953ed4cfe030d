import type { Page } from 'playwright-core'
import { describe, expect, it } from 'vitest'
import { browsing } from '@/tests/support/browsing'
import { box, takeMeasure } from '@/tests/support/field-sheet'
import { readPdf } from '@/tests/support/pdf-reader'
import { expectClean, signIn, widths } from '@/tests/support/visit'

const journeyman = ['renna@quarrylane.example', 'copper kettle under rain'] as const

const { visit } = browsing()

const dialog = (page: Page) => page.getByRole('dialog', { name: /^Save/ })
const main = (page: Page) => page.locator('main').innerText()

/** A sheet of the porch measure in a job of its own; gives the address of the sheet. */
async function keepSheet(page: Page, job: string): Promise<string> {
  await page.goto('/handbook/handrail')
  await takeMeasure(page)
  await page.getByRole('button', { name: 'Save to a job' }).click()
  await dialog(page).getByLabel('New job').fill(job)
  await dialog(page).getByLabel('Sheet').fill('Stoop rail')
  await dialog(page).getByRole('button', { name: 'Save the cut sheet' }).click()
  await page.waitForURL(/\/jobs\/[^/]+\/sheets\/1$/)
  await page.getByRole('article', { name: 'Sheet' }).waitFor()
  return page.url()
}

/** Opens the kept sheet to be revised, changes the landing, and fills the dialog. */
async function revise(page: Page, landing: string, note: string): Promise<void> {
  await page.getByRole('link', { name: 'Revise', exact: true }).click()
  await page.waitForURL(/\/handbook\/handrail\?/)
  await box(page, 'landings[0].length').fill(landing)
  await page.getByRole('button', { name: 'Save as a revision' }).click()
  await dialog(page).getByLabel('What changed').fill(note)
}

describe.each(widths)('a cut sheet in the job book at %d px', (width) => {
  it('is saved, reopened, revised, compared, and the old one is superseded', async () => {
    const visited = await visit(width)
    const { page } = visited
    await signIn(visited, ...journeyman)
    const address = await keepSheet(page, `Quarry Street walk-up ${width}`)
    await expectClean(visited)
    const first = await main(page)
    expect(first).toContain('revision 1')
    expect(first).not.toContain('uperseded')

    await revise(page, '52', 'landing measured again')
    await expectClean(visited)
    await dialog(page).getByRole('button', { name: 'Save revision 2' }).click()
    await page.waitForURL(address)
    await expect.poll(() => main(page)).toContain('revision 2: landing measured again')
    await expectClean(visited)

    await page.getByRole('link', { name: 'What changed', exact: true }).click()
    await page.waitForURL(/compare\?was=1&is=2/)
    const row = page.getByRole('row', { name: /landing length/i })
    expect(await row.getByRole('cell').allInnerTexts()).toEqual(['48', '52', '+4.000'])
    await expectClean(visited)

    await page.goto(`${address}?revision=1`)
    await expect.poll(() => main(page)).toContain('Superseded by revision 2')
    await expectClean(visited)
    await page.emulateMedia({ media: 'print' })
    expect(await page.getByText('Do not cut from this sheet').isVisible()).toBe(true)
    expect(await page.getByRole('link', { name: 'Open revision 2' }).isVisible()).toBe(false)
    const pdf = await page.request.get(`${new URL(address).pathname.replace('/jobs', '/api/jobs')}/pdf?revision=1`)
    expect(readPdf(await pdf.body()).pages[0]?.text).toContain('revision 2')
    await visited.context.close()
  })
})

describe('two who revise one sheet', () => {
  it('lose nothing: the later one is told, keeps what was typed, and may save after', async () => {
    const visited = await visit(1440)
    const { page } = visited
    await signIn(visited, ...journeyman)
    const address = await keepSheet(page, 'Two at once')
    await revise(page, '50', 'mine')

    const other = await visited.context.newPage()
    await other.goto(address)
    await revise(other, '51', 'theirs')
    await dialog(other).getByRole('button', { name: 'Save revision 2' }).click()
    await other.waitForURL(address)

    await dialog(page).getByRole('button', { name: 'Save revision 2' }).click()
    await expect.poll(() => dialog(page).innerText()).toContain('Somebody saved revision 2 while you worked')
    expect(await dialog(page).getByLabel('What changed').inputValue()).toBe('mine')
    await dialog(page).getByRole('button', { name: 'Save mine after theirs' }).click()
    await dialog(page).getByRole('button', { name: 'Save revision 3' }).click()
    await page.waitForURL(address)
    await expect.poll(() => main(page)).toContain('revision 3: mine')
    await visited.context.close()
  })
})

describe('who may keep a sheet', () => {
  it('a stranger is led to sign in, and comes back to the numbers', async () => {
    const visited = await visit(390)
    const { page } = visited
    await page.goto('/handbook/pitch?rise=7&run=11')
    await page.getByRole('button', { name: 'Save to a job' }).click()
    await dialog(page).getByRole('link', { name: 'Sign in' }).waitFor()
    await expectClean(visited)
    await dialog(page).getByRole('link', { name: 'Sign in' }).click()
    await page.getByLabel('E-mail').fill(journeyman[0])
    await page.getByLabel('Password').fill(journeyman[1])
    await page.getByRole('button', { name: 'Sign in' }).click()
    await page.waitForURL(/\/handbook\/pitch\?rise=7&run=11/)
    await visited.context.close()
  })

  it('an apprentice is told that journeymen keep a job book', async () => {
    const visited = await visit(1440)
    const { page } = visited
    await page.goto('/sign-in?from=%2Fhandbook%2Fmiter')
    await page.getByLabel('E-mail').fill('ilse@quarrylane.example')
    await page.getByLabel('Password').fill(journeyman[1])
    await page.getByRole('button', { name: 'Sign in' }).click()
    await page.waitForURL('**/handbook/miter')
    await page.getByRole('button', { name: 'Save to a job' }).click()
    await expect.poll(() => dialog(page).innerText()).toContain('Journeymen keep a job book')
    await visited.context.close()
  })
})
