import { databaseUrl } from '@/lib/config'
import { migrate } from '@/migrations/migrate'

// `tsx scripts/migrate.ts` brings the tables up to date; with `down` it takes them all away. Safe to run again.
try {
  const direction = process.argv[2] === 'down' ? 'down' : 'up'
  let steps = 0
  await migrate(databaseUrl(), direction, (line) => {
    steps++
    console.log(`  ${line}`)
  })
  console.log(steps === 0 ? 'The tables are up to date.' : `${steps} steps done.`)
} catch (error) {
  console.error(error instanceof Error ? error.message : error)
  process.exitCode = 1
}
