// @ts-check
import { createHash } from 'node:crypto'
import { existsSync, readFileSync, statSync, writeFileSync } from 'node:fs'
import { holderOf } from './lock.mjs'
import { npm } from './npm.mjs'
import { step } from './progress.mjs'
import { mustRun } from './run.mjs'
import { Stop } from './stop.mjs'

const lockfile = 'package-lock.json'
const installedLockfile = 'node_modules/.package-lock.json'
const stamp = 'node_modules/.longpoint-packages'

/** @throws {Stop} when this Node cannot run Longpoint */
export function requireNode() {
  const [major = 0, minor = 0] = process.versions.node.split('.').map(Number)
  if (major > 20 || (major === 20 && minor >= 19)) return
  throw new Stop(`Longpoint needs Node 20.19 or newer; this is ${process.versions.node}. Install a newer Node.`)
}

/**
 * npm's packages as package-lock.json names them: installed when missing or of another lockfile.
 * @param {string} dataDirectory whose running app must not lose its packages under its feet
 */
export async function installPackages(dataDirectory) {
  const wanted = createHash('sha256').update(readFileSync(lockfile)).digest('hex')
  if (packagesAreCurrent(wanted)) return
  const running = holderOf(dataDirectory)
  if (running && running.pid !== process.pid)
    throw new Stop('The packages changed while Longpoint is running from them. Stop it, then run this again.')
  await step('Installing packages (npm ci)', () =>
    mustRun(
      'npm could not install the packages. Check the network and the free disk space, then run this again.',
      ...npm('ci', '--include=dev', '--no-audit', '--no-fund'),
    ),
  )
  writeFileSync(stamp, wanted)
}

/** @param {string} wanted */
function packagesAreCurrent(wanted) {
  if (existsSync(stamp) && readFileSync(stamp, 'utf8') === wanted) return true
  // Somebody may have run npm by hand: then npm's own record is as new as the lockfile.
  return existsSync(installedLockfile) && statSync(installedLockfile).mtimeMs >= statSync(lockfile).mtimeMs
}
