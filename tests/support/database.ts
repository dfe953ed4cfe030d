import { randomBytes } from 'node:crypto'
import { mkdtempSync, rmSync } from 'node:fs'
import os from 'node:os'
import path from 'node:path'
import { createConnection } from 'mariadb'
import { afterAll } from 'vitest'
import { migrate } from '@/migrations/migrate'
import { startMariadb } from '@/scripts/setup/mariadb'
import { Stop } from '@/scripts/setup/stop.mjs'

/**
 * A real MariaDB with an empty, migrated database for one test file. Import this first: whatever is imported after it
 * connects to that database. `npm test` gives the server; a file run alone starts one of its own.
 */
const server = process.env.TEST_DATABASE_URL ? given(process.env.TEST_DATABASE_URL) : await ownServer()
const name = `test_${randomBytes(6).toString('hex')}`

export const databaseUrl = server.url(name)
await statement(`CREATE DATABASE ${name} CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci`)
await migrate(databaseUrl, 'up', () => undefined)
Object.assign(process.env, {
  DATABASE_URL: databaseUrl,
  APP_ORIGIN: 'http://localhost:3000',
  AUTH_SECRET: randomBytes(32).toString('hex'),
  NODE_ENV: 'test',
})
delete process.env.NEXTAUTH_URL

afterAll(async () => {
  const { database } = await import('@/models/connect')
  await database().close()
  await statement(`DROP DATABASE ${name}`)
  await server.stop()
})

/** One statement on a connection of its own, beside the app's pool. Rows, when it gives any. */
export async function statement(sql: string, database = 'information_schema'): Promise<Record<string, unknown>[]> {
  const connection = await createConnection(server.url(database))
  try {
    return await connection.query(sql)
  } finally {
    await connection.end()
  }
}

/** One statement in this file's database. */
export const query = (sql: string) => statement(sql, name)

/** Another empty database beside this file's own; `drop` it at the end. */
export async function emptyDatabase() {
  const other = `test_${randomBytes(6).toString('hex')}`
  await statement(`CREATE DATABASE ${other} CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci`)
  const drop = () => statement(`DROP DATABASE ${other}`)
  return { url: server.url(other), query: (sql: string) => statement(sql, other), drop }
}

function given(address: string) {
  const url = (database: string) => new URL(`/${database}`, address).href
  return { url, stop: () => Promise.resolve() }
}

async function ownServer() {
  const directory = mkdtempSync(path.join(os.tmpdir(), 'longpoint-api-'))
  const remove = () => rmSync(directory, { recursive: true, force: true })
  try {
    const { url, stop } = await startMariadb({ directory, password: randomBytes(12).toString('hex'), reach: 'all' })
    return { url, stop: () => stop().then(remove) }
  } catch (error) {
    remove()
    throw error instanceof Stop ? new Error(`${error.message}\n${error.detail ?? ''}`) : error
  }
}
