import { query } from '@/tests/support/database'
import { describe, expect, it } from 'vitest'
import { DELETE as putAway, GET as one, PATCH as change } from '@/app/api/jobs/[id]/route'
import { GET as list, POST as create } from '@/app/api/jobs/route'
import type { JobLine, JobView, Page } from '@/lib/schemas/views'
import { AuditEvent, Job } from '@/models'
import { call, problemIn, read } from '@/tests/support/call'
import { newJob, newSheet } from '@/tests/support/jobs'
import { newPerson } from '@/tests/support/people'
import type { Person } from '@/tests/support/people'

const journeyman = await newPerson('journeyman')

const send = (id: string, body: unknown, as: Person = journeyman) => call(change, 'PATCH', { as, params: { id }, body })
const look = async (id: string) => read<JobView>(await call(one, 'GET', { as: journeyman, params: { id } }))
const book = async (as: Person, search = '') => read<Page<JobLine>>(await call(list, 'GET', { as, query: search }))

describe('a job', () => {
  it('is kept to the letter', async () => {
    const form = {
      name: ' <b>Ünïcode 👷‍♀️ ',
      place: "O'Hara & Söhne; DROP TABLE jobs",
      client: '\t=1+1',
      notes: 'a\r\nb\u0000c',
    }
    const { id } = await read<{ id: string }>(await call(create, 'POST', { as: journeyman, body: form }))
    expect(await look(id)).toMatchObject({ ...form, version: 1, archivedAt: null, writable: true, sheets: [] })
  })

  it('changes only in what is named, and leaves an audit row', async () => {
    const id = await newJob(journeyman, 'Before')
    expect(await read(await send(id, { place: 'Pier 4', version: 1 }))).toEqual({ version: 2 })
    expect(await look(id)).toMatchObject({ name: 'Before', place: 'Pier 4', version: 2 })
    const rows = await AuditEvent.findAll({ where: { subjectId: id }, raw: true })
    expect(rows).toMatchObject([{ action: 'job.changed', actorId: journeyman.id, details: { place: 'Pier 4' } }])
  })

  it('takes no field that is not named for it', async () => {
    const other = await newPerson('journeyman')
    const forged = {
      id: other.id,
      shopId: other.shopId,
      ownerId: other.id,
      role: 'coordinator',
      userId: other.id,
      createdAt: 0,
      archivedAt: 'x',
    }
    const { id } = await read<{ id: string }>(
      await call(create, 'POST', { as: journeyman, body: { name: 'Mine', version: 9, ...forged } }),
    )
    await send(id, { ...forged, name: 'Still mine', version: 1 })
    const row = await Job.findByPk(id, { raw: true })
    expect(row).toMatchObject({
      shopId: journeyman.shopId,
      ownerId: journeyman.id,
      name: 'Still mine',
      version: 2,
      archivedAt: null,
    })
  })

  it('goes out of the list when put away, and comes back', async () => {
    const person = await newPerson('journeyman')
    const id = await newJob(person)
    const gone = await call(putAway, 'DELETE', { as: person, params: { id }, body: { version: 1 } })
    expect(await read(gone)).toEqual({ version: 2 })
    expect((await book(person)).lines).toEqual([])
    expect((await book(person, '?archived=yes')).lines.map((line) => line.id)).toEqual([id])
    await send(id, { archived: false, version: 2 }, person)
    expect((await book(person)).lines.map((line) => line.id)).toEqual([id])
  })
})

describe('two who save the same job', () => {
  it('get one save and one conflict that says what stands', async () => {
    const id = await newJob(journeyman)
    expect((await send(id, { notes: 'first', version: 1 })).status).toBe(200)
    const late = await send(id, { notes: 'second', version: 1 })
    expect(late.status).toBe(409)
    expect((await problemIn(late)).current).toBe(2)
    expect((await look(id)).notes).toBe('first')
  })

  it('lose none of 200 saves made at once', async () => {
    const id = await newJob(journeyman)
    const saves = Array.from({ length: 8 }, async (_, writer) => {
      let [saved, refused] = [0, 0]
      while (saved < 25) {
        const { notes, version } = await look(id)
        const response = await send(id, { notes: `${notes}${writer}`, version })
        if (response.status === 200) saved++
        else refused++
      }
      return refused
    })
    const refused = await Promise.all(saves)
    const { notes, version } = await look(id)
    expect(notes).toHaveLength(200)
    expect([...'01234567'].map((writer) => notes.split(writer).length - 1)).toEqual(Array(8).fill(25))
    expect(version).toBe(201)
    expect(Math.max(...refused)).toBeGreaterThan(0) // without a meeting of two this would prove nothing
  })
})

describe('the wall', () => {
  it('answers a foreign job exactly as a missing one', async () => {
    const id = await newJob(await newPerson('journeyman'))
    const missing = '01930000-0000-7000-8000-00000000dead'
    for (const [handler, method, body] of [
      [one, 'GET'],
      [change, 'PATCH', { version: 1 }],
      [putAway, 'DELETE', { version: 1 }],
    ] as const) {
      const answers = [id, missing].map(async (asked) => {
        const response = await call(handler, method, { as: journeyman, params: { id: asked }, body })
        return [response.status, await response.text(), [...response.headers]]
      })
      const [foreign, none] = await Promise.all(answers)
      expect(foreign?.[0]).toBe(404)
      expect(foreign).toEqual(none)
    }
    expect(await Job.findByPk(id, { raw: true })).toMatchObject({ version: 1, archivedAt: null })
  })

  it('lets everybody of the shop’s journeymen in, and its coordinator to read', async () => {
    const id = await newJob(journeyman)
    const mate = await newPerson('journeyman', journeyman.shopId)
    const coordinator = await newPerson('coordinator', journeyman.shopId)
    expect((await send(id, { notes: 'from a mate', version: 1 }, mate)).status).toBe(200)
    const view = await read<JobView>(await call(one, 'GET', { as: coordinator, params: { id } }))
    expect(view).toMatchObject({ notes: 'from a mate', writable: false })
    expect((await send(id, { notes: 'no', version: 2 }, coordinator)).status).toBe(403)
  })
})

describe('the job book', () => {
  it('comes in pages that miss and repeat nothing, last changed first', async () => {
    const person = await newPerson('journeyman')
    const at = new Date()
    const { shopId, id: ownerId } = person
    const job = { shopId, ownerId, place: '', client: '', notes: '', createdAt: at, updatedAt: at }
    const rows = await Job.bulkCreate(Array.from({ length: 120 }, (_, n) => ({ ...job, name: `Job ${n}` })))
    const seen: string[] = []
    let cursor: string | null = ''
    while (cursor !== null) {
      const page: Page<JobLine> = await book(person, cursor && `?cursor=${cursor}`)
      seen.push(...page.lines.map((line) => line.id))
      cursor = page.next
    }
    expect(seen).toEqual(
      rows
        .map((row) => row.id)
        .sort()
        .reverse(),
    )
    await newSheet(person, seen[60] ?? '')
    await send(seen[60] ?? '', { name: 'Changed', version: 1 }, person)
    expect((await book(person)).lines[0]).toMatchObject({ id: seen[60], name: 'Changed', sheets: 1 })
  })

  it('refuses a cursor that is none', async () => {
    for (const cursor of ['x', 'bnVsbA', 'WyJ4IiwieSJd', '%00']) {
      const response = await call(list, 'GET', { as: journeyman, query: `?cursor=${cursor}` })
      expect(response.status).toBe(422)
      expect((await problemIn(response)).errors?.[0]?.field).toBe('cursor')
    }
  })

  it('is read off its index', async () => {
    const [plan] = await query(
      `EXPLAIN SELECT id FROM jobs WHERE shopId = '${journeyman.shopId}' AND archived = 0 ORDER BY updatedAt DESC, id DESC LIMIT 51`,
    )
    expect(plan).toMatchObject({ key: 'jobs_list' })
    expect(String(plan?.Extra)).not.toContain('filesort')
  })
})
