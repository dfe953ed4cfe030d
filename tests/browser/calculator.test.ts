import type { Page } from 'playwright-core'
import { describe, expect, it } from 'vitest'
import { browsing } from '@/tests/support/browsing'
import { expectClean, widths } from '@/tests/support/visit'

const { visit } = browsing()

/** What the page says, with stacked fractions read as text. */
const says = (page: Page) => page.locator('main').innerText()

describe('a calculator at the desk', () => {
  it('answers as it is typed, keeps the numbers in the address, and brings them back', async () => {
    const visited = await visit(1440)
    const { page } = visited
    await page.goto('/handbook/pitch')
    await page.getByRole('textbox', { name: 'Rise', exact: true }).fill('7 1/8')
    await page.getByRole('textbox', { name: 'Run', exact: true }).fill('10.5')
    await expect.poll(() => page.url()).toContain('rise=7+1%2F8&run=10.5')
    // atan(7.125 / 10.5)
    await expect.poll(() => says(page)).toContain('34.16°')
    const address = page.url()
    await page.goto('/handbook')
    await page.goto(address)
    await expect.poll(() => says(page)).toContain('34.16°')
    expect(await page.getByRole('textbox', { name: 'Rise', exact: true }).inputValue()).toBe('7 1/8')
    await expectClean(visited)
    await visited.context.close()
  })

  it('says at the field what is off, and loses nothing', async () => {
    const visited = await visit(1440)
    const { page } = visited
    await page.goto('/handbook/miter')
    const field = page.getByRole('textbox', { name: 'Slope below the knuckle' })
    await field.fill('steep')
    await expect.poll(() => field.getAttribute('aria-invalid')).toBe('true')
    const fault = await field.getAttribute('aria-describedby')
    expect(await page.locator(`#${CSS_escape(fault)}`).innerText()).toContain('Write degrees')
    expect(await field.inputValue()).toBe('steep')
    await expectClean(visited)
    await visited.context.close()
  })

  it('is worked by keyboard alone', async () => {
    const visited = await visit(1440)
    const { page } = visited
    await page.goto('/handbook/miter')
    await page.getByRole('textbox', { name: 'Slope below the knuckle' }).focus()
    await page.keyboard.press('Control+A')
    await page.keyboard.type('40')
    await page.keyboard.press('Tab')
    await page.keyboard.press('Control+A')
    await page.keyboard.type('4')
    await expect.poll(() => says(page)).toContain('144.0°')
    await visited.context.close()
  })
})

const CSS_escape = (id: string | null) => (id ?? '').split(' ')[0]?.replace(/[^\w-]/g, '\\$&') ?? ''

describe.each(widths)('the front page at %d px', (width) => {
  it('has a working calculator on it', async () => {
    const visited = await visit(width)
    const { page } = visited
    await page.goto('/')
    expect(await page.locator('main svg[role=img]').count()).toBeGreaterThan(0)
    await expect.poll(() => says(page)).toContain('Set the saw')
    await expectClean(visited)
    await visited.context.close()
  })
})
