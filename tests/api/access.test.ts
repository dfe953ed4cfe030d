import '@/tests/support/database'
import { readdirSync } from 'node:fs'
import path from 'node:path'
import { describe, expect, it } from 'vitest'
import { newGround, type Ground } from '@/tests/support/access-ground'
import { actors, type Actor } from '@/tests/support/access-actors'
import { accessTable, type Row } from '@/tests/support/access-table'
import { call, origin } from '@/tests/support/call'
import { underWay } from '@/tests/support/request-scope'

const verbs = ['GET', 'POST', 'PUT', 'PATCH', 'DELETE', 'HEAD', 'OPTIONS'] as const
type Handlers = { [verb in (typeof verbs)[number]]?: Parameters<typeof call>[0] }

/** Every handler that stands on disk, as `jobs/[id] PATCH`. */
const files = readdirSync('app/api', { recursive: true, encoding: 'utf8' }).filter((file) => file.endsWith('route.ts'))
const routes = await Promise.all(
  files.map(async (file) => {
    const place = file.replace(/\/?route\.ts$/, '')
    const handlers = (await import(/* @vite-ignore */ path.resolve('app/api', file))) as Handlers
    return verbs
      .filter((verb) => handlers[verb])
      .map((verb) => ({ name: `${place} ${verb}`, verb, handler: handlers[verb] }))
  }),
)
const found = routes.flat()

/** Asks as this actor would, on rows of their own making each time. */
async function ask(row: Row, route: (typeof found)[number], actor: Actor, ground: Ground): Promise<Response> {
  const { verb, handler } = route
  if (!handler) throw new Error(`No handler of ${route.name}`)
  const sent = {
    as: ground.people[actor],
    params: row.params?.(ground) ?? {},
    body: row.body?.(ground),
    query: row.query ?? '',
  }
  return underWay(new Request(origin), () => call(handler, verb, sent))
}

describe('the access table', () => {
  it('lists every handler on disk and no other', () => {
    expect(files.length).toBeGreaterThan(8)
    expect(found.map(({ name }) => name).sort()).toEqual(Object.keys(accessTable).sort())
  })

  describe.each(found)('$name', (route) => {
    const row = accessTable[route.name]
    it.each(actors)('answers %s as the table says', async (actor) => {
      if (!row) throw new Error(`${route.name} is not in the access table`)
      const { status } = await ask(row, route, actor, await newGround())
      expect(status).toBe(row.answers[actor])
    })
  })
})
