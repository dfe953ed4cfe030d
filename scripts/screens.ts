import { mkdirSync } from 'node:fs'
import path from 'node:path'
import { openBrowser } from '../tests/support/browser'

/** Pictures of the README, taken from a running Longpoint: `npx tsx scripts/screens.ts http://localhost:3000`. */
const screens = [
  { file: 'miter-desk', page: '/handbook/miter', width: 1440, height: 1000 },
  { file: 'miter-phone', page: '/handbook/miter', width: 390, height: 844 },
  { file: 'handrail-desk', page: '/handbook/handrail', width: 1440, height: 1100 },
  { file: 'cut-sheet', page: '/handbook/handrail/sheet', width: 1000, height: 1300 },
] as const

const origin = process.argv[2] ?? 'http://localhost:3000'
const folder = path.join(import.meta.dirname, '../public/screens')

mkdirSync(folder, { recursive: true })
const browser = await openBrowser()
for (const { file, page: at, width, height } of screens) {
  const page = await browser.newPage({ viewport: { width, height }, isMobile: width < 640, reducedMotion: 'reduce' })
  await page.goto(origin + at, { waitUntil: 'networkidle' })
  await page.screenshot({ path: path.join(folder, `${file}.png`) })
  console.log(`  public/screens/${file}.png`)
  await page.close()
}
await browser.close()
