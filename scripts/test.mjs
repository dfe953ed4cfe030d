// @ts-check
import path from 'node:path'
import { dataDirectory, enter } from './setup/entry.mjs'
import { Lock } from './setup/lock.mjs'
import { installPackages, requireNode } from './setup/packages.mjs'
import { Stop } from './setup/stop.mjs'

/** `npm test`. Plain Node until the packages are there, TypeScript from then on. Never touches the data of `npm start`. */
await enter(async () => {
  requireNode()
  const directory = path.join(dataDirectory(), 'test')
  const lock = new Lock(directory)
  const taken = lock.take()
  if ('heldBy' in taken)
    throw new Stop(`The tests are running already (process ${taken.heldBy.pid}). Wait for them to end.`)
  await installPackages(dataDirectory())
  const { register } = await import('tsx/esm/api')
  register()
  const { test } = await import('./test/main.ts')
  return test({ lock, directory, leftovers: taken.leftovers, flags: process.argv.slice(2) })
})
