import '@/tests/support/database'
import { beforeEach, describe, expect, it } from 'vitest'
import { GET as one } from '@/app/api/jobs/[id]/route'
import { GET as revisions } from '@/app/api/jobs/[id]/sheets/[sheet]/revisions/route'
import { GET as sheet, POST as revise } from '@/app/api/jobs/[id]/sheets/[sheet]/route'
import { POST as save } from '@/app/api/jobs/[id]/sheets/route'
import type { JobView, RevisionLine, SheetView } from '@/lib/schemas/views'
import { CutSheet } from '@/models'
import { call, problemIn, read } from '@/tests/support/call'
import { newJob, sheetForm } from '@/tests/support/jobs'
import { newPerson } from '@/tests/support/people'
import type { Person } from '@/tests/support/people'

const journeyman = await newPerson('journeyman')
let job = ''

beforeEach(async () => {
  job = await newJob(journeyman, 'Porch')
})

const saveIt = (body: object = sheetForm, as: Person = journeyman) =>
  call(save, 'POST', { as, params: { id: job }, body })
const reviseIt = (revises: number, body: object = {}, number = 1, as: Person = journeyman) =>
  call(revise, 'POST', {
    as,
    params: { id: job, sheet: String(number) },
    body: { ...sheetForm, note: 'again', revises, ...body },
  })
const look = async (number = 1, query = '') =>
  read<SheetView>(await call(sheet, 'GET', { as: journeyman, params: { id: job, sheet: String(number) }, query }))

describe('a saved cut sheet', () => {
  it('is revision 1 of the job’s next number', async () => {
    expect(await read(await saveIt())).toEqual({ sheet: 1, revision: 1 })
    expect(await read(await saveIt({ ...sheetForm, name: 'Second' }))).toEqual({ sheet: 2, revision: 1 })
    const view = await read<JobView>(await call(one, 'GET', { as: journeyman, params: { id: job } }))
    expect(view.sheets.map(({ sheet: number, name, revision }) => [number, name, revision])).toEqual([
      [1, 'Porch rail', 1],
      [2, 'Second', 1],
    ])
  })

  it('keeps what the server computes, whatever is sent beside', async () => {
    // A level run that meets a 34 degree rake is cut at 17: half the bend.
    await saveIt({
      ...sheetForm,
      results: { outputs: { miter: 1 } },
      revision: 7,
      sheet: 99,
      calculatorRevision: 99,
      createdBy: 'x',
    })
    const view = await look()
    expect(view).toMatchObject({
      sheet: 1,
      revision: 1,
      currentRevision: 1,
      calculator: 'miter',
      createdBy: 'A journeyman',
    })
    expect(view.results.outputs).toMatchObject({ bend: 34, miter: 17 })
    expect(view).toMatchObject({ jobName: 'Porch', measuredOn: '2026-03-31', supersededAt: null, writable: true })
  })

  it('takes the measure as a person writes it', async () => {
    await saveIt({ ...sheetForm, inputs: { slopeBelow: '0', slopeAbove: '34 deg' } })
    expect((await look()).inputs).toMatchObject({ slopeBelow: 0, slopeAbove: 34 })
  })

  it('names the input that its calculator refuses', async () => {
    const response = await saveIt({ ...sheetForm, inputs: { slopeBelow: 0, slopeAbove: 'steep' } })
    expect(response.status).toBe(422)
    expect((await problemIn(response)).errors?.map(({ field }) => field)).toEqual(['inputs.slopeAbove'])
    expect(await CutSheet.count({ where: { jobId: job } })).toBe(0)
  })

  it('names a calculator or a tape that there is not', async () => {
    const unknown = await problemIn(await saveIt({ ...sheetForm, calculator: 'no-such' }))
    const tape = await problemIn(await saveIt({ ...sheetForm, precision: { tape: 7 } }))
    expect([unknown, tape].map(({ errors }) => errors?.map(({ field }) => field))).toEqual([
      ['calculator'],
      ['precision.tape'],
    ])
  })
})

describe('a revision', () => {
  it('adds a row and marks the older one superseded, which stays to be read', async () => {
    await saveIt()
    const answer = await reviseIt(1, { inputs: { slopeBelow: 0, slopeAbove: 36 }, note: 'Upper flight measured again' })
    expect(await read(answer)).toEqual({ sheet: 1, revision: 2 })
    const [now, before] = [await look(), await look(1, '?revision=1')]
    expect(now).toMatchObject({
      revision: 2,
      currentRevision: 2,
      supersededAt: null,
      note: 'Upper flight measured again',
    })
    expect(now.results.outputs).toMatchObject({ miter: 18 })
    expect(before).toMatchObject({ revision: 1, currentRevision: 2 })
    expect(before.supersededAt).not.toBeNull()
    expect(before.results.outputs).toMatchObject({ miter: 17 })
    const list = await read<RevisionLine[]>(
      await call(revisions, 'GET', { as: journeyman, params: { id: job, sheet: '1' } }),
    )
    expect(list.map(({ revision, note }) => [revision, note])).toEqual([
      [2, 'Upper flight measured again'],
      [1, ''],
    ])
  })

  it('of one that was replaced meanwhile is refused with the one that stands', async () => {
    await saveIt()
    await reviseIt(1)
    const late = await reviseIt(1)
    expect(late.status).toBe(409)
    expect((await problemIn(late)).current).toBe(2)
  })

  it('made by ten at once is made by one', async () => {
    await saveIt()
    const statuses = (await Promise.all(Array.from({ length: 10 }, () => reviseIt(1)))).map(({ status }) => status)
    expect(statuses.sort()).toEqual([201, ...Array(9).fill(409)])
    const rows = await CutSheet.findAll({
      where: { jobId: job },
      attributes: ['revision', 'supersededAt'],
      order: ['revision'],
      raw: true,
    })
    expect(rows.map(({ supersededAt }) => supersededAt === null)).toEqual([false, true])
  })

  it('says what changed', async () => {
    await saveIt()
    const response = await reviseIt(1, { note: ' ' })
    expect((await problemIn(response)).errors).toEqual([{ field: 'note', message: 'What changed is missing.' }])
  })

  it('finds no sheet of another number, job or shop', async () => {
    await saveIt()
    expect((await reviseIt(1, {}, 2)).status).toBe(404)
    expect((await reviseIt(1, {}, 1, await newPerson('journeyman'))).status).toBe(404)
  })
})

describe('sheets saved at once', () => {
  it('take a number each', async () => {
    const answers = await Promise.all(Array.from({ length: 12 }, () => saveIt()))
    const places = await Promise.all(answers.map((answer) => read<{ sheet: number }>(answer)))
    expect(places.map((place) => place.sheet).sort((a, b) => a - b)).toEqual(
      Array.from({ length: 12 }, (_, n) => n + 1),
    )
  })
})
