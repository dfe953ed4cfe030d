import { register } from 'node:module'
import { Unfit } from '@/lib/errors'

// `tsx scripts/seed.ts` seeds the demo shop of DATABASE_URL, once. Safe to run again.
register('./seed/server-only.mjs', import.meta.url)
try {
  // Imported only now: what it imports needs the line above.
  const { seedDemo } = await import('./seed/demo')
  let parts = 0
  await seedDemo((line) => {
    parts++
    console.log(`  ${line}`)
  })
  console.log(parts === 0 ? 'The demo shop is there.' : 'The demo shop is seeded.')
} catch (error) {
  if (error instanceof Unfit) for (const { field, message } of error.errors) console.error(`${field}: ${message}`)
  console.error(error instanceof Error ? error.message : error)
  process.exitCode = 1
}
