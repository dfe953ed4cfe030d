import '@/tests/support/database'
import { describe, expect, it } from 'vitest'
import { allCalculators } from '@/lib/calculators'
import { openapi } from '@/lib/schemas/openapi'
import { accessTable } from '@/tests/support/access-table'

const { paths } = openapi(await allCalculators())

/** Every route that another program may call. The sign-in speaks to our own screens only. */
const served = Object.keys(accessTable)
  .map((name) => name.split(' ') as [string, string])
  .filter(([place, verb]) => verb !== 'OPTIONS' && !place.startsWith('auth/') && place !== 'openapi.json')
  .map(([place, verb]) => `/api/${place.replaceAll('[', '{').replaceAll(']', '}')} ${verb.toLowerCase()}`)

const described = Object.entries(paths).flatMap(([path, verbs]) => {
  const place = path.startsWith('/api/calculators/') ? path.replace(/(calculators\/)[^/]+/, '$1{id}') : path
  return Object.keys(verbs as object).map((verb) => `${place} ${verb}`)
})

describe('the description of the API', () => {
  it('has every route that is served', () => {
    expect(served.filter((route) => !described.includes(route))).toEqual([])
  })

  it('asks for a key wherever a row is made', () => {
    for (const [path, verb] of [
      ['/api/jobs', 'post'],
      ['/api/start', 'post'],
      ['/api/jobs/{id}/sheets', 'post'],
    ] as const)
      expect(JSON.stringify((paths as Record<string, Record<string, unknown>>)[path]?.[verb])).toContain(
        'Idempotency-Key',
      )
  })
})
