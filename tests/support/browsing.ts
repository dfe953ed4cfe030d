import type { Browser } from 'playwright-core'
import { afterAll, beforeAll } from 'vitest'
import { openBrowser } from './browser'
import { servedApp, type ServedApp } from './server'
import { visit } from './visit'

/** The app and one browser for the tests of a file. */
export function browsing() {
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
  return {
    /** A new visitor at this width, with nothing kept from before. */
    visit: (width: number) => visit(browser, app.url, width),
    /** A new visitor whose browser runs no scripts. */
    visitWithoutScripts: () => browser.newContext({ baseURL: app.url, javaScriptEnabled: false }),
    host: () => new URL(app.url).host,
  }
}
