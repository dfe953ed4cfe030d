import { mkdirSync } from 'node:fs'
import path from 'node:path'
import { railPath } from '../components/sheet/rail-sheet'
import { handrail } from '../lib/calculators/field/handrail'
import { openBrowser } from '../tests/support/browser'

const exampleSheet = railPath(handrail.example).replace('/handrail?', '/handrail/sheet?')

/** Pictures of the README, taken from a running Longpoint: `npx tsx scripts/screens.ts http://localhost:3000`. */
const screens: readonly { file: string; page: string; width: number; height: number; only?: string }[] = [
  { file: 'miter-desk', page: '/handbook/miter', width: 1440, height: 1000 },
  { file: 'miter-phone', page: '/handbook/miter', width: 390, height: 844 },
  { file: 'handrail-desk', page: '/handbook/handrail', width: 1440, height: 1100 },
  { file: 'cut-sheet', page: exampleSheet, width: 1000, height: 1300, only: '.printed' },
]

const origin = process.argv[2] ?? 'http://localhost:3000'
const folder = path.join(import.meta.dirname, '../public/screens')

mkdirSync(folder, { recursive: true })
const browser = await openBrowser()
for (const { file, page: at, width, height, only } of screens) {
  const page = await browser.newPage({ viewport: { width, height }, isMobile: width < 640, reducedMotion: 'reduce' })
  await page.goto(origin + at, { waitUntil: 'networkidle' })
  const shot = { path: path.join(folder, `${file}.png`) }
  await (only ? page.locator(only).screenshot(shot) : page.screenshot(shot))
  console.log(`  public/screens/${file}.png`)
  await page.close()
}
await browser.close()
