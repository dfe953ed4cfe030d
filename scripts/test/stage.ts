import { rmSync } from 'node:fs'
import path from 'node:path'
import { chromium, ensure } from '../setup/debian'
import type { Lock } from '../setup/lock.mjs'
import { startMariadb } from '../setup/mariadb'
import type { DatabaseServer } from '../setup/mariadb'
import { anyFreePort } from '../setup/ports'
import { runScript } from '../setup/script'
import { secretsOf } from '../setup/secrets'
import { appEnvironment, buildWhenStale, startApp } from '../start/app'
import type { Suite } from './plan'
import { runsIn } from './runs'

/** The tests' own build: a running `npm start` reads its pages from `.next`, and keeps them. */
export const testBuild = '.data/test-build'

/** What the suites stand on, each thing made when the first suite asks for it and shared by those after. */
export class Stage {
  #database: Promise<DatabaseServer> | undefined
  #build: Promise<void> | undefined
  #app: Promise<{ url: string; databaseUrl: string }> | undefined

  constructor(
    readonly lock: Lock,
    readonly directory: string,
  ) {}

  /** The environment of one suite. The user's own database and settings are never in it. */
  async setFor(suite: Suite): Promise<NodeJS.ProcessEnv> {
    const env: NodeJS.ProcessEnv = { ...withoutSettings(), TEST_RUNS_DIR: runsIn(this.directory) }
    if (suite === 'api') env.TEST_DATABASE_URL = (await this.database()).url()
    if (suite === 'browser') Object.assign(env, await this.browserEnvironment())
    if (suite === 'faults') Object.assign(env, await this.faultsEnvironment())
    return env
  }

  private async browserEnvironment() {
    await ensure(chromium)
    const { url, databaseUrl } = await (this.#app ??= this.startApp())
    return { TEST_APP_URL: url, TEST_APP_DATABASE_URL: databaseUrl }
  }

  private async faultsEnvironment() {
    await this.build()
    return { NEXT_DIST_DIR: testBuild }
  }

  private database(): Promise<DatabaseServer> {
    return (this.#database ??= startDatabase(this.lock, this.directory))
  }

  private build(): Promise<void> {
    const env = { ...withoutSettings(), NODE_ENV: 'production', NEXT_DIST_DIR: testBuild } as const
    return (this.#build ??= buildWhenStale(env))
  }

  private async startApp() {
    const databaseUrl = (await this.database()).url()
    await this.build()
    const port = await anyFreePort()
    const url = `http://localhost:${port}`
    const host = '127.0.0.1'
    const { authSecret } = secretsOf(this.directory)
    const given = { databaseUrl, host, port, origin: url, authSecret, dev: false }
    const env = { ...appEnvironment(withoutSettings(), given), NEXT_DIST_DIR: testBuild }
    await runScript('Making the tables of the browser tests', 'scripts/migrate.ts', env)
    await runScript('Seeding the demo shop of the browser tests', 'scripts/seed.ts', env)
    const log = path.join(this.directory, 'app.log')
    rmSync(log, { force: true })
    await startApp({ dev: false, host, port, env, log, record: (pid) => this.lock.addChild('app', pid) })
    return { url, databaseUrl }
  }
}

function startDatabase(lock: Lock, directory: string) {
  rmSync(path.join(directory, 'mariadb'), { recursive: true, force: true })
  const password = secretsOf(directory).databasePassword
  return startMariadb({ directory, password, reach: 'all', record: (pid) => lock.addChild('mariadb', pid) })
}

/** This process's environment without what would lead a test to the user's own data. */
function withoutSettings(): NodeJS.ProcessEnv {
  const env = { ...process.env }
  for (const name of [
    'DATABASE_URL',
    'APP_ORIGIN',
    'AUTH_SECRET',
    'SMTP_URL',
    'HOST',
    'PORT',
    'LONGPOINT_DATA_DIR',
    'NODE_ENV',
  ])
    delete (env as Record<string, string | undefined>)[name]
  return env
}
