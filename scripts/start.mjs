// @ts-check
import { existsSync } from 'node:fs'
import { dataDirectory, enter } from './setup/entry.mjs'
import { Lock } from './setup/lock.mjs'
import { installPackages, requireNode } from './setup/packages.mjs'
import { Stop } from './setup/stop.mjs'

/** `npm start` and `npm run dev`. Plain Node until the packages are there, TypeScript from then on. */
await enter(async () => {
  requireNode()
  if (existsSync('.env')) process.loadEnvFile('.env')
  const lock = new Lock(dataDirectory())
  const taken = lock.take()
  if ('heldBy' in taken) throw new Stop(alreadyRunning(taken.heldBy))
  await installPackages(dataDirectory())
  const { register } = await import('tsx/esm/api')
  register()
  const { start } = await import('./start/main.ts')
  return start({ lock, leftovers: taken.leftovers, flags: process.argv.slice(2) })
})

/** @param {import('./setup/lock.mjs').Holder} holder */
function alreadyRunning({ pid, address }) {
  const where = address ? `is running already at ${address}` : 'is being started already'
  return `Longpoint ${where} (process ${pid}). Stop that one first with Ctrl-C where it runs, or with: kill ${pid}`
}
