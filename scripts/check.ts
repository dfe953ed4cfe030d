import { enter } from './setup/entry.mjs'
import { runChecks } from './test/checks'
import { totalsLine } from './test/totals'

/** `npm run check`: types, lint, format, boundaries, knip and pins, without any test. */
await enter(async () => {
  const totals = await runChecks()
  console.log(`\n${totalsLine(totals)}`)
  return totals.failed > 0 ? 1 : 0
})
