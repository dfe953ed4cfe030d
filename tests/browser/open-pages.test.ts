import type { Browser } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { calculatorIds } from '@/lib/calculators/load'
import { openBrowser } from '@/tests/support/browser'
import { servedApp, type ServedApp } from '@/tests/support/server'
import { expectClean, visit, widths } from '@/tests/support/visit'

let app: ServedApp
let browser: Browser

beforeAll(async () => {
  app = await servedApp()
  browser = await openBrowser()
})
afterAll(async () => {
  await browser?.close()
  await app?.stop()
})

const pages = [
  '/',
  '/handbook',
  '/handbook/taking-the-measure',
  ...calculatorIds.map((id) => `/handbook/${id}`),
  '/sign-in',
  '/start',
]
const themes = ['paper', 'sun', 'night'] as const

/** Every page at every width, each in another theme: pairs of them all come up. */
const rounds = pages.flatMap((path, i) =>
  [320, ...widths].map((width, j) => [path, width, themes[(i + j) % themes.length] ?? 'paper'] as const),
)

describe('open pages', () => {
  it.each(rounds)('%s at %d px, %s', async (path, width, theme) => {
    const visited = await visit(browser, app.url, width)
    await visited.page.addInitScript(
      (chosen) => localStorage.setItem('longpoint.preferences', JSON.stringify({ theme: chosen })),
      theme,
    )
    await visited.page.goto(path, { waitUntil: 'load' })
    await visited.page.waitForLoadState('networkidle')
    expect(await visited.page.locator('h1').count()).toBe(1)
    await expectClean(visited)
    await visited.context.close()
  })

  it('say kindly that nothing is there', async () => {
    const visited = await visit(browser, app.url, 390)
    const response = await visited.page.goto('/handbook/no-such-calculator')
    expect(response?.status()).toBe(404)
    expect(await visited.page.locator('h1').innerText()).not.toBe('')
    await visited.context.close()
  })

  it('need no script to show the answer of the example', async () => {
    const context = await browser.newContext({ baseURL: app.url, javaScriptEnabled: false })
    const page = await context.newPage()
    await page.goto('/handbook/miter')
    expect(await page.locator('main').innerText()).toContain('Set the saw, 0 is square')
    expect(await page.locator('main svg[role=img]').count()).toBeGreaterThan(0)
    await context.close()
  })

  it('set the security headers and load nothing from elsewhere', async () => {
    const visited = await visit(browser, app.url, 1440)
    const hosts = new Set<string>()
    visited.page.on('request', (request) => hosts.add(new URL(request.url()).host))
    const response = await visited.page.goto('/handbook/pitch')
    await visited.page.waitForLoadState('networkidle')
    const headers = response?.headers() ?? {}
    const policy = headers['content-security-policy'] ?? ''
    const scripts = /script-src ([^;]*)/.exec(policy)?.[1] ?? ''
    expect(scripts).not.toMatch(/unsafe-inline|unsafe-eval|\*/)
    expect(policy).toContain("frame-ancestors 'none'")
    expect(policy).toContain("object-src 'none'")
    expect(headers['x-content-type-options']).toBe('nosniff')
    expect([...hosts]).toEqual([new URL(app.url).host])
    await visited.context.close()
  })
})
