import { distDirectory, isCurrent } from '../build/sources'
import { defer } from '../setup/cleanup.mjs'
import { step } from '../setup/progress.mjs'
import { runScript } from '../setup/script'
import { Service } from '../setup/service'
import { Stop } from '../setup/stop.mjs'

export interface AppSettings {
  dev: boolean
  host: string
  port: number
  env: NodeJS.ProcessEnv
  log: string | 'inherit'
  record?: (pid: number) => void
}

const next = 'node_modules/next/dist/bin/next'
const readyWithinMs = 120_000

interface AppGiven {
  databaseUrl: string
  host: string
  port: number
  origin: string
  authSecret: string
  dev: boolean
}

/** What the app reads from its environment, over what the caller has; a secret of the user's own stands. */
export function appEnvironment(base: NodeJS.ProcessEnv, given: AppGiven): NodeJS.ProcessEnv {
  return {
    ...base,
    NODE_ENV: given.dev ? 'development' : 'production',
    NEXT_TELEMETRY_DISABLED: '1',
    DATABASE_URL: given.databaseUrl,
    HOST: given.host,
    PORT: String(given.port),
    APP_ORIGIN: given.origin,
    NEXTAUTH_URL: given.origin,
    AUTH_SECRET: base.AUTH_SECRET || given.authSecret,
  }
}

/** Build when the build is missing, unfinished, or of other sources. */
export async function buildWhenStale(env: NodeJS.ProcessEnv): Promise<void> {
  if (!isCurrent(distDirectory(env))) await runScript('Building the app', 'scripts/build.ts', env)
}

/** Start the app and wait until it answers. Gives what keeps it alive from then on. Throws Stop when it does not answer. */
export async function startApp({ dev, host, port, env, log, record }: AppSettings) {
  const args = [next, dev ? 'dev' : 'start', '--hostname', host, '--port', String(port)]
  const service = new Service({ name: 'The app', command: process.execPath, args, env, log, graceMs: 10_000, record })
  defer(() => service.stop())
  const probe = () => answersAt(addressOf(host, port))
  await step('Starting the app', async () => {
    if (await service.answers(probe, readyWithinMs)) return
    throw new Stop('The app did not start: what it printed says why.')
  })
  return { keepAlive: () => service.keepAlive(probe) }
}

/** Where this machine itself reaches the app. */
function addressOf(host: string, port: number): string {
  const reachable = host === '0.0.0.0' ? '127.0.0.1' : host === '::' ? '::1' : host
  return `http://${reachable.includes(':') ? `[${reachable}]` : reachable}:${port}`
}

async function answersAt(address: string): Promise<boolean> {
  try {
    const response = await fetch(address, { signal: AbortSignal.timeout(30_000), redirect: 'manual' })
    await response.body?.cancel()
    return response.status < 500
  } catch {
    return false
  }
}
