import { chromium } from 'playwright-core'
import type { Browser } from 'playwright-core'

/** What keeps Debian's Chromium quiet: no first-run pages, no calls home. */
const quiet = [
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
]

/** Debian's Chromium without a window. Close it when done. */
export function openBrowser(): Promise<Browser> {
  // Chromium refuses its sandbox to root, as which containers run.
  const asRoot = process.getuid?.() === 0 ? ['--no-sandbox'] : []
  return chromium.launch({ executablePath: process.env.CHROMIUM || '/usr/bin/chromium', args: [...quiet, ...asRoot] })
}
