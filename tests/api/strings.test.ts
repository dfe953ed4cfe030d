import '@/tests/support/database'
import { existsSync, readdirSync, readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { GET as one } from '@/app/api/jobs/[id]/route'
import { POST as create } from '@/app/api/jobs/route'
import { POST as start } from '@/app/api/start/route'
import type { JobView } from '@/lib/schemas/views'
import { call, origin, read } from '@/tests/support/call'
import { newPerson } from '@/tests/support/people'

const corpus = '../shared/corpus/strings'
const there = existsSync(corpus)
if (!there) console.warn(`NOT RUN: the hostile strings of ${corpus} are not on this machine.`)

const naughty = there ? list(`${corpus}/minimaxir_big-list-of-naughty-strings_blns.json`) : []
const markup = there ? markupOf(`${corpus}/markup-payloads.json`) : []
const journeyman = await newPerson('journeyman')

function list(file: string): string[] {
  return JSON.parse(readFileSync(file, 'utf8')) as string[]
}

function markupOf(file: string): string[] {
  const { payloads } = JSON.parse(readFileSync(file, 'utf8')) as { payloads: { payload: string }[] }
  return payloads.map(({ payload }) => payload)
}

async function throughJob(text: string): Promise<[number, string?]> {
  const form = { name: 'x', place: text.slice(0, 200), client: text.slice(0, 120), notes: text.slice(0, 4000) }
  const response = await call(create, 'POST', { as: journeyman, body: form })
  if (response.status !== 201) return [response.status]
  const { id } = await read<{ id: string }>(response)
  const { place, client, notes } = await read<JobView>(await call(one, 'GET', { as: journeyman, params: { id } }))
  expect({ place, client, notes }).toEqual({ place: form.place, client: form.client, notes: form.notes })
  return [201, notes]
}

describe.skipIf(!there)('hostile strings', () => {
  it('come back from every text field to the letter', async () => {
    const answers = await Promise.all([...naughty, ...markup].map(throughJob))
    expect(answers.length).toBeGreaterThan(600)
    // Cutting at a field's length may halve a character, which is refused and not stored as another.
    const refused = answers.filter(([status]) => status !== 201)
    expect(refused.filter(([status]) => status !== 422)).toEqual([])
    expect(refused.length).toBeLessThan(5)
  })

  it('are refused or taken by the start form, never a fault of ours', async () => {
    for (const [n, text] of [...naughty, ...markup].entries()) {
      const body = { name: text, shop: text, email: text, password: text }
      const { status } = await call(start, 'POST', { body, headers: { 'x-longpoint-address': `caller ${n}` } })
      expect(status).toBe(422)
    }
  })
})

describe.skipIf(!there)('bodies of the JSON test suite', () => {
  const folder = `${corpus}/jsontestsuite`
  const files = there ? readdirSync(folder).filter((file) => file.endsWith('.json')) : []

  it.each(files)('%s', async (file) => {
    const headers = {
      Origin: origin,
      Cookie: journeyman.cookie,
      'Content-Type': 'application/json',
      'Idempotency-Key': `json-${file}`.slice(0, 100),
    }
    const request = new Request(`${origin}/api/jobs`, {
      method: 'POST',
      headers,
      body: readFileSync(`${folder}/${file}`),
    })
    const { status } = await create(request, { params: Promise.resolve({}) })
    if (file.startsWith('y_')) expect(status).toBe(422)
    else if (file.startsWith('n_')) expect(file === 'n_structure_no_data.json' ? [422] : [400, 413]).toContain(status)
    else expect([400, 413, 422]).toContain(status)
  })
})
