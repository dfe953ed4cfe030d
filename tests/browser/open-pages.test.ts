import { describe, expect, it } from 'vitest'
import { calculatorIds } from '@/lib/calculators/load'
import { browsing } from '@/tests/support/browsing'
import { expectClean, widths } from '@/tests/support/visit'

const { visit, visitWithoutScripts, host } = browsing()

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
  it.concurrent.each(rounds)('%s at %d px, %s', async (path, width, theme) => {
    const visited = await visit(width)
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
    const visited = await visit(390)
    const response = await visited.page.goto('/handbook/no-such-calculator')
    expect(response?.status()).toBe(404)
    expect(await visited.page.locator('h1').innerText()).not.toBe('')
    await visited.context.close()
  })

  it('need no script to show the answer of the example', async () => {
    const context = await visitWithoutScripts()
    const page = await context.newPage()
    await page.goto('/handbook/miter')
    expect(await page.locator('main').innerText()).toContain('Set the saw, 0 is square')
    expect(await page.locator('main svg[role=img]').count()).toBeGreaterThan(0)
    await context.close()
  })

  it('set the security headers and load nothing from elsewhere', async () => {
    const visited = await visit(1440)
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
    expect([...hosts]).toEqual([host()])
    await visited.context.close()
  })
})
