import '@/tests/support/database'
import { describe, expect, it } from 'vitest'
import { GET as list } from '@/app/api/calculators/route'
import { GET as describeOne, OPTIONS as preflight, POST as compute } from '@/app/api/calculators/[id]/route'
import { GET as openapi } from '@/app/api/openapi.json/route'
import type { Answer } from '@/lib/calculators/answer'
import { calculatorIds } from '@/lib/calculators/load'
import { call, problemIn, read } from '@/tests/support/call'
import { examplesOf, expectWithin } from '@/tests/support/examples'

const ask = (id: string, body: unknown, headers = {}) => call(compute, 'POST', { params: { id }, body, headers })
const faultsOf = async (response: Response) => {
  expect(response.status).toBe(422)
  return (await problemIn(response)).errors ?? []
}

const rail = {
  hand: 'R',
  section: { shape: 'round', depth: 1.5, width: 1.5 },
  railHeight: 36,
  flights: [{ risers: 13, rise: 7, run: 11 }],
  bottom: { type: 'none' },
  top: { type: 'none' },
}

describe('a calculator over HTTP', () => {
  it.each(calculatorIds)('%s answers its worked examples', async (id) => {
    for (const { inputs, expected, tolerance } of examplesOf(id)) {
      const response = await ask(id, { inputs })
      expect(response.status).toBe(200)
      const answer = await read<Answer>(response)
      const { failedChecks, ...outputs } = expected
      expectWithin(answer.outputs, outputs, tolerance.abs)
      expect(answer).toMatchObject({
        id,
        text: expect.any(Object),
        steps: expect.any(Array),
        sources: expect.any(Array),
      })
      if (failedChecks) {
        const checks = answer.outputs.checks as { id: string; ok: boolean | null }[]
        expect(checks.filter(({ ok }) => ok === false).map((row) => row.id)).toEqual(failedChecks)
      }
    }
  })

  it('reads quantities as people write them and says how it understood them', async () => {
    const inputs = { slopeBelow: '32.5 deg', slopeAbove: '0', depth: '38.1 mm' }
    const answer = await read<Answer>(await ask('miter', { inputs }))
    expect(answer.inputs).toMatchObject({ slopeBelow: 32.5, slopeAbove: 0, depth: 1.5 })
    expect(answer.text.sawSquareIs0).toBe('16 1/4°')
  })

  it('rounds to the asked tape and dial, and lets an entry’s own step win', async () => {
    const inputs = { slopeBelow: 33.7, slopeAbove: 0 }
    const coarse = await read<Answer>(await ask('miter', { inputs, precision: { tape: 8, dial: 1 } }))
    expect(coarse.outputs.sawSquareIs0).toBe(17)
    expect(coarse.text.setback).toBe('1/2"')
    const own = await read<Answer>(await ask('miter', { inputs: { ...inputs, dialStep: 0.5 }, precision: { dial: 1 } }))
    expect(own.text.sawSquareIs0).toBe('17°')
    expect(own.outputs.sawSquareIs0).toBe(17)
  })

  it('may be called from anywhere, without Origin and without a sign-in', async () => {
    for (const Origin of [null, 'https://elsewhere.example']) {
      const response = await ask('pitch', { inputs: { rise: 7, run: 11 } }, { Origin })
      expect(response.status).toBe(200)
      expect(response.headers.get('access-control-allow-origin')).toBe('*')
      expect(response.headers.get('set-cookie')).toBeNull()
    }
    expect((await preflight()).headers.get('access-control-allow-headers')).toBe('Content-Type')
  })
})

describe('what cannot be taken', () => {
  it('is named once for each wrong field', async () => {
    const inputs = { slopeBelow: 'steep', slopeAbove: 200, depth: -1, dialStep: 3, colour: 'red' }
    const faults = await faultsOf(await ask('miter', { inputs }))
    expect(faults.map(({ field }) => field).sort()).toEqual(['colour', 'depth', 'dialStep', 'slopeAbove', 'slopeBelow'])
    for (const { message } of faults) expect(message).toMatch(/\.$/)
  })

  it.each([
    ['section.depth', { section: { ...rail.section, depth: 0 } }],
    ['section.width', { section: { ...rail.section, width: -1 } }],
    ['railHeight', { railHeight: 0 }],
    ['flights', { flights: [] }],
    ['flights[0].rise', { flights: [{ risers: 13, run: 11 }] }],
    ['flights[0]', { flights: [{ risers: 13, rake: 84, rise: 7, run: 11 }] }],
    ['flights[0].firstRise', { flights: [{ rake: 84, pitch: 33 }], bottom: { type: 'level', length: 12 } }],
    ['flights[1].firstRise', { flights: [rail.flights[0], { rake: 84, pitch: 33 }], landings: [{ length: 48 }] }],
    ['landings', { flights: [rail.flights[0], rail.flights[0]] }],
    ['bottom.horizontal', { bottom: { type: 'slope' } }],
    ['bottom.length', { bottom: { type: 'level' } }],
    ['top.length', { top: { type: 'level' } }],
    ['hand', { hand: 'X' }],
  ])('names %s in a handrail', async (field, changed) => {
    const faults = await faultsOf(await ask('handrail', { inputs: { ...rail, ...changed } }))
    expect(faults.map((fault) => fault.field)).toContain(field)
  })

  it('is a part whose shorter edge is under 2 in, and nothing is guessed', async () => {
    const faults = await faultsOf(await ask('handrail', { inputs: { ...rail, top: { type: 'level', length: 1.5 } } }))
    expect(faults[0]?.field).toBe('top.length')
  })

  it('is an unknown tape or dial', async () => {
    const faults = await faultsOf(
      await ask('pitch', { inputs: { rise: 7, run: 11 }, precision: { tape: 10, dial: 0.3 } }),
    )
    expect(faults.map(({ field }) => field)).toEqual(['precision.tape', 'precision.dial'])
  })

  it.each([['{'], ['{"inputs":'], ['not json']])('is refused as unreadable: %s', async (body) => {
    expect((await problemIn(await ask('miter', body))).status).toBe(400)
  })

  it.each([[[]], [{}], [{ inputs: 3 }], [{ inputs: {}, more: 1 }], ['"text"'], ['null']])(
    '%j gets a sentence',
    async (body) => {
      expect((await faultsOf(await ask('miter', body))).length).toBeGreaterThan(0)
    },
  )

  it('is a calculator that is not there, and a body over 64 KB', async () => {
    expect((await problemIn(await ask('nothing', { inputs: {} }))).status).toBe(404)
    expect((await problemIn(await ask('miter', { inputs: { depth: ' '.repeat(70_000) } }))).status).toBe(413)
  })
})

describe('the description', () => {
  it('lists every calculator with the schema of its inputs, and may be kept by a cache', async () => {
    const response = await call(list, 'GET')
    expect(response.headers.get('cache-control')).toContain('public')
    const listed = await read<{ id: string; inputs: { properties: object } }[]>(response)
    expect(listed.map(({ id }) => id)).toEqual(calculatorIds)
    for (const { inputs } of listed) expect(Object.keys(inputs.properties).length).toBeGreaterThan(0)
  })

  it('is the same for one calculator alone', async () => {
    const one = await read<{ id: string }>(await call(describeOne, 'GET', { params: { id: 'pitch' } }))
    const all = await read<{ id: string }[]>(await call(list, 'GET'))
    expect(all.find(({ id }) => id === 'pitch')).toEqual(one)
  })

  it('is OpenAPI 3.1 with a path for each calculator', async () => {
    const document = await read<{ openapi: string; paths: object }>(await call(openapi, 'GET'))
    expect(document.openapi).toBe('3.1.0')
    for (const id of calculatorIds) expect(document.paths).toHaveProperty([`/api/calculators/${id}`, 'post'])
  })
})
