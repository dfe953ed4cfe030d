import { fullDisk, freeBytes, dataDirectory } from '../setup/entry.mjs'
import type { Identity, Lock } from '../setup/lock.mjs'
import { startMariadb } from '../setup/mariadb'
import { step } from '../setup/progress.mjs'
import { runScript } from '../setup/script'
import { secretsOf } from '../setup/secrets'
import { endLeftovers } from '../setup/service'
import { Stop } from '../setup/stop.mjs'
import { appEnvironment, buildWhenStale, startApp } from './app'
import { readOptions } from './options'
import { claimPort } from './port'
import { seedDemo } from './demo'
import { welcome } from './welcome'

interface Beginning {
  lock: Lock
  /** What a killed start left running. */
  leftovers: Identity[]
  flags: readonly string[]
}

/** An empty database, its log and the build take this much; less only ends in the middle. */
const roomNeededBytes = 400 * 1024 * 1024

/** Everything `npm start` does once the packages are there. Runs until it is told to stop, or gives 1. */
export async function start({ lock, leftovers, flags }: Beginning): Promise<number> {
  const asked = readOptions(flags, process.env)
  const directory = dataDirectory()
  if (freeBytes() < roomNeededBytes) throw new Stop(fullDisk())
  if (leftovers.length > 0) await step('Ending what a killed start left running', () => endLeftovers(leftovers, 30_000))
  const options = await claimPort(asked)

  const secrets = secretsOf(directory)
  const database = options.databaseUrl ? undefined : await ownDatabase(lock, directory, secrets.databasePassword)
  const databaseUrl = options.databaseUrl ?? database?.url() ?? ''
  const env = appEnvironment(process.env, { ...options, databaseUrl, authSecret: secrets.authSecret })

  await runScript('Bringing the tables up to date', 'scripts/migrate.ts', env)
  const signIns = await seedDemo(options.host, env)
  if (!options.dev) await buildWhenStale(env)
  const app = await startApp({ ...options, env, log: 'inherit', record: (pid) => lock.addChild('app', pid) })
  lock.announce(options.origin)
  welcome(options, signIns)
  const watched = [app.keepAlive(), ...(database ? [database.keepAlive()] : [])]
  await Promise.race(watched)
  throw new Stop('Something Longpoint needs keeps ending. Everything was stopped; what was printed above says why.')
}

function ownDatabase(lock: Lock, directory: string, password: string) {
  const record = (pid: number) => lock.addChild('mariadb', pid)
  return startMariadb({ directory, password, reach: 'one', record })
}
