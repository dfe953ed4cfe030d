import { mkdirSync, writeFileSync } from 'node:fs'
import path from 'node:path'
import { pagesOf } from './bench/bytes'
import { measureFloor } from './bench/floor'
import { sourceSizes } from './bench/sizes'
import type { Spread } from './bench/sizes'
import { distDirectory } from './build/sources'
import { dataDirectory, enter } from './setup/entry.mjs'
import { buildWhenStale } from './start/app'

const kilobytes = (bytes: number) => `${(bytes / 1024).toFixed(1)} KB`
const lines = ({ count, median, p90, largest }: Spread) => `${count}, median ${median}, p90 ${p90}, largest ${largest}`

/** `npm run bench`: what each prerendered page loads against a bare page of the same day, and how large the sources are. */
await enter(async () => {
  await buildWhenStale({ ...process.env })
  const floor = await measureFloor('.data/bench-floor')
  const pages = pagesOf(distDirectory()).map((page) => ({ ...page, overFloor: page.jsGzip - floor }))
  const sizes = sourceSizes()

  console.log(`\nBare page: ${kilobytes(floor)} of JavaScript, gzip`)
  console.table(
    pages.map(({ page, scripts, jsGzip, overFloor, cssGzip, htmlGzip }) => ({
      page,
      scripts,
      js: kilobytes(jsGzip),
      'over floor': kilobytes(overFloor),
      css: kilobytes(cssGzip),
      html: kilobytes(htmlGzip),
    })),
  )
  console.log(`Files (lines): ${lines(sizes.files)}\nFunctions (lines): ${lines(sizes.functions)}`)
  record({ measuredAt: new Date().toISOString(), floor, pages, sizes })
  return 0
})

function record(figures: object) {
  const file = path.join(dataDirectory(), 'bench.json')
  mkdirSync(path.dirname(file), { recursive: true })
  writeFileSync(file, `${JSON.stringify(figures, null, 2)}\n`)
  console.log(`Written to ${path.relative(process.cwd(), file)}`)
}
