import { emptyDatabase } from '@/tests/support/database'
import { describe, expect, it } from 'vitest'
import { migrations } from '@/migrations'
import { migrate } from '@/migrations/migrate'

type Empty = Awaited<ReturnType<typeof emptyDatabase>>

async function schemaOf({ query }: Empty): Promise<Record<string, unknown>> {
  const tables = (await query('SHOW TABLES')).map((row) => String(Object.values(row)[0]))
  const made = tables.map(
    async (table) => [table, (await query(`SHOW CREATE TABLE ${table}`))[0]?.['Create Table']] as const,
  )
  return Object.fromEntries(await Promise.all(made))
}

const quiet = () => undefined

async function inEmpty(work: (database: Empty) => Promise<void>) {
  const database = await emptyDatabase()
  try {
    await work(database)
  } finally {
    await database.drop()
  }
}

describe('migrations', () => {
  it('up, down and up again give the same schema, and down leaves no table', () =>
    inEmpty(async (database) => {
      await migrate(database.url, 'up', quiet)
      const first = await schemaOf(database)
      expect(Object.keys(first).length).toBe(migrations.length + 1)
      await migrate(database.url, 'down', quiet)
      expect(Object.keys(await schemaOf(database))).toEqual(['migrations'])
      await migrate(database.url, 'up', quiet)
      expect(await schemaOf(database)).toEqual(first)
    }))

  it('run again after a kill before a step was noted', () =>
    inEmpty(async (database) => {
      await migrate(database.url, 'up', quiet)
      const whole = await schemaOf(database)
      for (const { name } of migrations) {
        await database.query(`DELETE FROM migrations WHERE name >= '${name}'`)
        await migrate(database.url, 'up', quiet)
      }
      expect(await schemaOf(database)).toEqual(whole)
    }))

  it('run again after a kill on the way down', () =>
    inEmpty(async (database) => {
      await migrate(database.url, 'up', quiet)
      await database.query('DROP TABLE outbox')
      await migrate(database.url, 'down', quiet)
      expect(Object.keys(await schemaOf(database))).toEqual(['migrations'])
    }))

  it('keep rows, and do nothing when nothing is due', () =>
    inEmpty(async (database) => {
      await migrate(database.url, 'up', quiet)
      await database.query("INSERT INTO shops VALUES ('01930000-0000-7000-8000-000000000001', 'Kept', NOW(3), NOW(3))")
      const said: string[] = []
      await migrate(database.url, 'up', (line) => said.push(line))
      expect(said).toEqual([])
      expect(await database.query('SELECT name FROM shops')).toMatchObject([{ name: 'Kept' }])
    }))

  it('give every table a primary key', () =>
    inEmpty(async (database) => {
      await migrate(database.url, 'up', quiet)
      for (const [table, made] of Object.entries(await schemaOf(database))) expect(made, table).toContain('PRIMARY KEY')
    }))
})
