import '@/tests/support/database'
import { afterEach, describe, expect, it, vi } from 'vitest'
import { POST as create } from '@/app/api/jobs/route'
import { GET as one, PATCH as change } from '@/app/api/jobs/[id]/route'
import { bodyLimitBytes } from '@/lib/http/body'
import { handle } from '@/lib/http/handle'
import { log } from '@/lib/log'
import { z } from '@/lib/schemas/zod'
import { Job } from '@/models'
import { call, problemIn } from '@/tests/support/call'
import { newPerson } from '@/tests/support/people'

const journeyman = await newPerson('journeyman')
const jobs = () => Job.count({ where: { shopId: journeyman.shopId } })

afterEach(() => vi.restoreAllMocks())

describe('the origin of a change', () => {
  const origins = [
    null,
    'null',
    '',
    'https://elsewhere.example',
    'http://localhost:3001',
    'https://localhost:3000',
    'http://localhost:3000.elsewhere.example',
  ]

  it.each(origins)('is refused when it is %s', async (Origin) => {
    const before = await jobs()
    const response = await call(create, 'POST', { as: journeyman, body: { name: 'x' }, headers: { Origin } })
    expect(response.status).toBe(403)
    await problemIn(response)
    expect(await jobs()).toBe(before)
  })

  it('may be any of loopback’s names', async () => {
    for (const Origin of ['http://127.0.0.1:3000', 'http://[::1]:3000']) {
      const response = await call(create, 'POST', { as: journeyman, body: { name: 'x' }, headers: { Origin } })
      expect(response.status).toBe(201)
    }
  })
})

describe('a body', () => {
  const send = (body: unknown, headers = {}) => call(create, 'POST', { as: journeyman, body, headers })

  it('over the limit is refused, announced or not', async () => {
    const large = JSON.stringify({ name: 'x', notes: 'y'.repeat(bodyLimitBytes) })
    expect((await send(large)).status).toBe(413)
    const stream = new Blob([large]).stream()
    const init = {
      method: 'POST',
      body: stream,
      duplex: 'half',
      headers: { Origin: 'http://localhost:3000', Cookie: journeyman.cookie },
    }
    const response = await create(new Request('http://localhost:3000/api/jobs', init), { params: Promise.resolve({}) })
    expect(response.status).toBe(413)
    expect((await problemIn(response)).detail).toContain('64 KB')
  })

  it('at the limit is read', async () => {
    const rest = JSON.stringify({ name: 'x', filler: '' }).length
    const response = await send(JSON.stringify({ name: 'x', filler: 'y'.repeat(bodyLimitBytes - rest) }))
    expect(response.status).toBe(201)
  })

  it.each(['{', '{"name":}', 'name=x', '\u0000'])('that is not JSON is answered 400: %s', async (body) => {
    const response = await send(body)
    expect(response.status).toBe(400)
    await problemIn(response)
  })

  it('of another type is answered 415', async () => {
    expect((await send('{"name":"x"}', { 'Content-Type': 'text/plain' })).status).toBe(415)
  })

  it('names every wrong field in one sentence each', async () => {
    const response = await send({ name: '  ', place: 7, notes: 'n'.repeat(4001) })
    expect(response.status).toBe(422)
    const { errors } = await problemIn(response)
    expect(errors).toEqual([
      { field: 'name', message: 'The job’s name is missing.' },
      { field: 'place', message: 'The place is missing.' },
      { field: 'notes', message: 'The notes may have at most 4000 characters.' },
    ])
  })

  it.each([[[]], ['text'], [null], [7], [undefined]])('that is no object is refused: %j', async (body) => {
    const response = await send(body === undefined ? undefined : JSON.stringify(body))
    expect(response.status).toBe(422)
    expect((await problemIn(response)).errors?.length).toBeGreaterThan(0)
  })
})

describe('an address', () => {
  it.each(['x', '1', '00000000-0000-0000-0000-00000000000g', "' OR 1=1 --", '../jobs'])(
    'that is no id finds nothing: %s',
    async (id) => {
      const response = await call(one, 'GET', { as: journeyman, params: { id } })
      expect(response.status).toBe(404)
      await problemIn(response)
    },
  )

  it('is looked at before the body', async () => {
    const response = await call(change, 'PATCH', { as: journeyman, params: { id: 'x' }, body: '{' })
    expect(response.status).toBe(404)
  })
})

describe('what nobody expected', () => {
  const secret = 'SELECT passwordHash FROM users'
  const broken = handle({
    who: 'anyone',
    query: z.object({}).optional(),
    run: async () => {
      throw new Error(secret)
    },
  })

  it('is answered with a number, and its text is in the log only', async () => {
    const logged = vi.spyOn(log, 'error').mockImplementation(() => undefined)
    const response = await call(broken, 'GET')
    expect(response.status).toBe(500)
    const problem = await problemIn(response)
    expect(JSON.stringify(problem)).not.toContain(secret)
    const [said] = logged.mock.calls[0] ?? []
    expect(said).toMatchObject({ id: problem.id, err: { message: secret } })
    expect(logged).toHaveBeenCalledTimes(1)
  })
})

describe('every answer', () => {
  it('is kept by no cache', async () => {
    const good = await call(create, 'POST', { as: journeyman, body: { name: 'x' } })
    const refused = await call(create, 'POST', { as: journeyman, body: {} })
    expect([good.headers.get('cache-control'), refused.headers.get('cache-control')]).toEqual(['no-store', 'no-store'])
  })
})
