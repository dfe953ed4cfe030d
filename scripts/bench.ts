import { mkdirSync, writeFileSync } from 'node:fs'
import path from 'node:path'
import { pagesOf } from './bench/bytes'
import { measureFloor } from './bench/floor'
import { sourceSizes } from './bench/sizes'
import type { Spread } from './bench/sizes'
import { loadedScripts } from './bench/loaded'
import { dataDirectory, enter } from './setup/entry.mjs'
import { Lock } from './setup/lock.mjs'
import { step } from './setup/progress.mjs'
import { endLeftovers } from './setup/service'
import { Stop } from './setup/stop.mjs'
import { Stage, testBuild } from './test/stage'

const kilobytes = (bytes: number) => `${(bytes / 1024).toFixed(1)} KB`
const lines = ({ count, median, p90, largest }: Spread) => `${count}, median ${median}, p90 ${p90}, largest ${largest}`

/** `npm run bench`: what each prerendered page loads against a bare page of the same day, and how large the sources are. */
await enter(async () => {
  const { TEST_APP_URL = '' } = await (await stageOfTests()).setFor('browser')
  const floor = await measureFloor('.data/bench-floor')
  const built = pagesOf(testBuild)
  const loaded = await step('Opening each page in Chromium', () =>
    loadedScripts(
      TEST_APP_URL,
      built.map(({ page }) => page),
    ),
  )
  const pages = built.map((page) => ({ ...page, overFloor: page.jsGzip - floor, jsLoaded: loaded.get(page.page) ?? 0 }))
  const sizes = sourceSizes()

  console.log(`\nBare page: ${kilobytes(floor)} of JavaScript, gzip`)
  console.table(
    pages.map(({ page, scripts, jsGzip, overFloor, jsLoaded, cssGzip, htmlGzip }) => ({
      page,
      scripts,
      'js named': kilobytes(jsGzip),
      'over floor': kilobytes(overFloor),
      'js fetched': kilobytes(jsLoaded),
      'fetched over floor': kilobytes(jsLoaded - floor),
      css: kilobytes(cssGzip),
      html: kilobytes(htmlGzip),
    })),
  )
  console.log(`Files (lines): ${lines(sizes.files)}\nFunctions (lines): ${lines(sizes.functions)}`)
  record({ measuredAt: new Date().toISOString(), floor, pages, sizes })
  return 0
})

/** The build and the app the browser tests look at: measured is what is tested, and a running app keeps its build. */
async function stageOfTests(): Promise<Stage> {
  const directory = path.join(dataDirectory(), 'test')
  const lock = new Lock(directory)
  const taken = lock.take()
  if ('heldBy' in taken) throw new Stop('The tests are running. Wait for them to end, then measure.')
  await endLeftovers(taken.leftovers, 10_000)
  return new Stage(lock, directory)
}

function record(figures: object) {
  const file = path.join(dataDirectory(), 'bench.json')
  mkdirSync(path.dirname(file), { recursive: true })
  writeFileSync(file, `${JSON.stringify(figures, null, 2)}\n`)
  console.log(`Written to ${path.relative(process.cwd(), file)}`)
}
