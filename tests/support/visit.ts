import { AxeBuilder } from '@axe-core/playwright'
import type { Browser, BrowserContext, Page } from 'playwright-core'
import { expect } from 'vitest'

export const widths = [390, 1440] as const

export interface Visit {
  page: Page
  context: BrowserContext
  /** What the page complained of: errors, refused scripts, failed loads. */
  complaints: string[]
}

/** A new visitor, on a phone or at a desk, with nothing kept from before. */
export async function visit(browser: Browser, url: string, width: number): Promise<Visit> {
  const phone = width < 640
  const context = await browser.newContext({
    baseURL: url,
    viewport: { width, height: phone ? 844 : 1000 },
    isMobile: phone,
    hasTouch: phone,
    reducedMotion: 'reduce',
  })
  const page = await context.newPage()
  page.setDefaultTimeout(20_000)
  const complaints: string[] = []
  page.on('pageerror', (error) => complaints.push(error.message))
  page.on('console', (message) => {
    if (message.type() === 'error') complaints.push(message.text())
  })
  return { page, context, complaints }
}

/** axe finds nothing, the page does not scroll sideways, and nothing was complained of. */
export async function expectClean({ page, complaints }: Visit): Promise<void> {
  const { violations } = await new AxeBuilder({ page }).analyze()
  const found = violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html.slice(0, 120)).join(' | ')}`)
  expect(found, page.url()).toEqual([])
  const [inner, outer] = await page.evaluate(() => [document.documentElement.scrollWidth, window.innerWidth])
  expect(inner, `sideways scroll at ${page.url()}`).toBeLessThanOrEqual(outer ?? 0)
  expect(complaints, page.url()).toEqual([])
}

/** Signs a demo person in and waits for the job book. */
export async function signIn({ page }: Visit, email: string, password: string): Promise<void> {
  await page.goto('/sign-in')
  await page.getByLabel('E-mail').fill(email)
  await page.getByLabel('Password').fill(password)
  await page.getByRole('button', { name: 'Sign in' }).click()
  await page.waitForURL('**/jobs')
}
