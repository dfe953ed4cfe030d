import { spawnSync } from 'node:child_process'
import { randomBytes } from 'node:crypto'
import { rmSync, writeFileSync } from 'node:fs'
import { distDirectory, hashSources, recordOf } from './build/sources'
import { dataDirectory } from './setup/entry.mjs'
import { holderOf } from './setup/lock.mjs'
import { typescript } from './setup/script'

/** `npm run build`: Next's build, the script hashes its pages are served with, then a record of what it was made of. */
const distDir = distDirectory()
/** A build asks no database and knows no address: it is the same wherever it will run. Modules check that these are set. */
const settings = {
  DATABASE_URL: 'mariadb://nobody@127.0.0.1:1/nothing',
  APP_ORIGIN: 'http://localhost:3000',
  AUTH_SECRET: randomBytes(32).toString('hex'),
}
const env = { ...process.env, ...settings, NODE_ENV: 'production', NEXT_TELEMETRY_DISABLED: '1' } as const
refuseUnderARunningApp()

const record = recordOf(distDir)
rmSync(record, { force: true })
// Hashed before the build: what changes while it runs makes it stale.
const sources = hashSources()
node('node_modules/next/dist/bin/next', 'build')
node(...typescript('scripts/csp-hashes.ts'))
writeFileSync(record, sources)

function node(...args: string[]) {
  const { status } = spawnSync(process.execPath, args, { stdio: 'inherit', env })
  if (status !== 0) process.exit(status ?? 1)
}

/** A build under a running app would take the pages away that it has yet to read. Its own parent may build first. */
function refuseUnderARunningApp() {
  if (distDir !== '.next') return
  const running = holderOf(dataDirectory())
  if (!running || running.pid === process.ppid) return
  console.error(
    `Longpoint is running from this build (process ${running.pid}). Stop it, then build; npm start builds by itself.`,
  )
  process.exit(1)
}
