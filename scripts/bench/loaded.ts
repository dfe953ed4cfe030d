import { gzipSync } from 'node:zlib'
import { chromium } from 'playwright-core'
import type { Page, Response } from 'playwright-core'

/**
 * JavaScript a browser fetches by itself when it opens each address for the first time, gzip bytes. More than the page
 * names: a calculator's entry is imported once the page runs, and links in sight are fetched ahead.
 */
export async function loadedScripts(origin: string, addresses: readonly string[]): Promise<Map<string, number>> {
  const asRoot = process.getuid?.() === 0 ? ['--no-sandbox'] : []
  const browser = await chromium.launch({ executablePath: '/usr/bin/chromium', args: asRoot })
  const loaded = new Map<string, number>()
  for (const address of addresses) {
    const context = await browser.newContext({ serviceWorkers: 'block' })
    loaded.set(address, await scriptBytes(await context.newPage(), origin + address))
    await context.close()
  }
  await browser.close()
  return loaded
}

async function scriptBytes(page: Page, url: string): Promise<number> {
  const sizes: Promise<number>[] = []
  const count = (response: Response) => {
    if (response.request().resourceType() === 'script')
      sizes.push(response.body().then((body) => gzipSync(body).length))
  }
  page.on('response', count)
  await page.goto(url, { waitUntil: 'networkidle' })
  // What still comes once the page is about to be closed has no body to measure.
  page.off('response', count)
  return (await Promise.all(sizes)).reduce((total, size) => total + size, 0)
}
