import '@/tests/support/database'
import { describe, expect, it, vi } from 'vitest'
import { POST as create } from '@/app/api/jobs/route'
import { POST as start } from '@/app/api/start/route'
import { once } from '@/lib/data/idempotency'
import { tidy } from '@/lib/data/tidy'
import { inTransaction } from '@/lib/data/transaction'
import { AuditEvent, IdempotencyKey, Job, Shop } from '@/models'
import { call, problemIn, read } from '@/tests/support/call'
import { newPerson } from '@/tests/support/people'

const jobsOf = (shopId: string) => Job.count({ where: { shopId } })
let made = 0
const newKey = () => `test-key-${made++}`

function send(as: Awaited<ReturnType<typeof newPerson>>, key: string | null, name = 'A job') {
  return call(create, 'POST', { as, body: { name }, headers: { 'Idempotency-Key': key } })
}

describe('a creating call', () => {
  it('is refused without a key, and with one that is none', async () => {
    const person = await newPerson('journeyman')
    for (const key of [null, '', 'short', 'a key with spaces', 'k'.repeat(101)])
      expect((await send(person, key)).status).toBe(400)
    expect(await jobsOf(person.shopId)).toBe(0)
  })

  it('that comes again gets the same answer and makes nothing more', async () => {
    const person = await newPerson('journeyman')
    const key = newKey()
    const [first, second] = [await send(person, key), await send(person, key)]
    expect([first.status, second.status]).toEqual([201, 201])
    expect(await read(second)).toEqual(await read(first))
    expect(await jobsOf(person.shopId)).toBe(1)
    expect(await AuditEvent.count({ where: { shopId: person.shopId } })).toBe(1)
  })

  it('that comes ten times at once makes one row', async () => {
    const person = await newPerson('journeyman')
    const key = newKey()
    const answers = await Promise.all(Array.from({ length: 10 }, () => send(person, key)))
    expect(answers.map(({ status }) => status)).toEqual(Array(10).fill(201))
    const ids = await Promise.all(answers.map(async (answer) => (await read<{ id: string }>(answer)).id))
    expect(new Set(ids).size).toBe(1)
    expect(await jobsOf(person.shopId)).toBe(1)
  })

  it('with a used key and another body is refused', async () => {
    const person = await newPerson('journeyman')
    const key = newKey()
    await send(person, key, 'One')
    const response = await send(person, key, 'Two')
    expect(response.status).toBe(422)
    expect((await problemIn(response)).errors?.[0]?.field).toBe('Idempotency-Key')
    expect(await jobsOf(person.shopId)).toBe(1)
  })

  it('has its key to itself: another person’s same key is another', async () => {
    const [one, other] = [await newPerson('journeyman'), await newPerson('journeyman')]
    const key = newKey()
    await send(one, key)
    await send(other, key)
    expect([await jobsOf(one.shopId), await jobsOf(other.shopId)]).toEqual([1, 1])
  })

  it('that was refused may be put right under the same key', async () => {
    const person = await newPerson('journeyman')
    const key = newKey()
    expect((await send(person, key, ' ')).status).toBe(422)
    expect((await send(person, key, 'Better')).status).toBe(201)
  })

  it('opens one shop however often the button is pressed', async () => {
    const body = {
      name: 'Ane Falk',
      shop: 'Falk Rails',
      email: 'ane@test.example',
      password: 'lantern moss orbit quill',
    }
    const key = newKey()
    const press = () => call(start, 'POST', { body, headers: { 'Idempotency-Key': key } })
    const answers = await Promise.all([press(), press(), press()])
    expect(answers.map(({ status }) => status)).toEqual([201, 201, 201])
    expect(await Shop.count({ where: { name: 'Falk Rails' } })).toBe(1)
    expect(JSON.stringify(await IdempotencyKey.findAll({ where: { key }, raw: true }))).not.toContain('lantern')
  })
})

describe('work that breaks off half-way', () => {
  it('leaves neither its rows nor its key', async () => {
    const key = newKey()
    const work = vi.fn(async () => {
      await inTransaction((transaction) => Shop.create({ name: key }, { transaction }))
      throw new Error('cut off')
    })
    await expect(once({ owner: 'anyone', key, asked: 'x' }, 201, work)).rejects.toThrow('cut off')
    expect(work).toHaveBeenCalledTimes(1)
    expect(await Shop.count({ where: { name: key } })).toBe(0)
    expect(await IdempotencyKey.count({ where: { key } })).toBe(0)
  })
})

describe('old answers', () => {
  it('are forgotten after a day', async () => {
    const key = newKey()
    await once({ owner: 'anyone', key, asked: 'x' }, 201, async () => ({}))
    await tidy(Date.now() + 23 * 3600_000)
    expect(await IdempotencyKey.count({ where: { key } })).toBe(1)
    await tidy(Date.now() + 25 * 3600_000)
    expect(await IdempotencyKey.count({ where: { key } })).toBe(0)
  })
})
