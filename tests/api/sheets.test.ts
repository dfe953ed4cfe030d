import '@/tests/support/database'
import { describe, expect, it } from 'vitest'
import { POST as draw } from '@/app/api/calculators/[id]/sheet/route'
import { GET as kept } from '@/app/api/jobs/[id]/sheets/[sheet]/pdf/route'
import { POST as revise } from '@/app/api/jobs/[id]/sheets/[sheet]/route'
import { POST as save } from '@/app/api/jobs/[id]/sheets/route'
import { calculatorIds, loadCalculator } from '@/lib/calculators/load'
import { call, problemIn } from '@/tests/support/call'
import { newJob, sheetForm } from '@/tests/support/jobs'
import { readPdf } from '@/tests/support/pdf-reader'
import { newPerson } from '@/tests/support/people'
import { examplesOf } from '@/tests/support/examples'

const largest = 200 * 1024

async function pdfOf(response: Response) {
  expect(response.status).toBe(200)
  expect(response.headers.get('content-type')).toBe('application/pdf')
  const bytes = Buffer.from(await response.arrayBuffer())
  expect(bytes.length).toBeLessThanOrEqual(largest)
  return readPdf(bytes)
}

const ask = (id: string, body: object) => call(draw, 'POST', { params: { id }, body })

describe('the printable sheet', () => {
  it.each(calculatorIds)('is one page for the example of %s, on either paper', async (id) => {
    const { example: inputs, name } = await loadCalculator(id)
    for (const paper of ['letter', 'a4']) {
      const { pages } = await pdfOf(await ask(id, { inputs, paper }))
      expect(pages).toHaveLength(1)
      expect(pages[0]?.text).toContain(id === 'handrail' ? 'Handrail' : name.split(' ')[0])
    }
  })

  it('carries what the reader wants at its head, and reads the saw as theirs does', async () => {
    const [{ inputs } = { inputs: {} }] = examplesOf('handrail')
    const head = { job: 'Quarry Street walk-up', measuredBy: 'R. Bell', measuredOn: '2026-11-24' }
    const { pages } = await pdfOf(await ask('handrail', { inputs, head, sawSquare: 90 }))
    for (const said of ['Quarry Street walk-up', 'R. Bell', '2026-11-24', '90 = square'])
      expect(pages[0]?.text).toContain(said)
  })

  it('is refused with the field named, as the calculator itself refuses', async () => {
    const { example } = await loadCalculator('handrail')
    const refused = async (body: object) => {
      const response = await ask('handrail', body)
      expect(response.status).toBe(422)
      return (await problemIn(response)).errors?.map(({ field }) => field)
    }
    expect(await refused({ inputs: { ...example, railHeight: 'high' } })).toEqual(['railHeight'])
    expect(await refused({ inputs: example, paper: 'napkin' })).toEqual(['paper'])
    expect(await refused({ inputs: example, precision: { tape: 7 } })).toEqual(['precision.tape'])
    expect(await refused({ inputs: example, head: { job: 'x'.repeat(121) } })).toEqual(['head.job'])
    expect(await refused({ inputs: example, head: { measuredOn: 'Tuesday' } })).toEqual(['head.measuredOn'])
  })

  it('is not there for a calculator that is not', async () => {
    expect((await ask('astrology', { inputs: {} })).status).toBe(404)
  })
})

describe('the PDF of a kept sheet', () => {
  it('is the current revision, and says of an earlier one that it is superseded', async () => {
    const journeyman = await newPerson('journeyman')
    const job = await newJob(journeyman, 'Quarry Street walk-up')
    const numbers = { calculator: 'handrail', inputs: (await loadCalculator('handrail')).example }
    const form = { ...sheetForm, ...numbers }
    await call(save, 'POST', { as: journeyman, params: { id: job }, body: form })
    const place = { as: journeyman, params: { id: job, sheet: '1' } }
    await call(revise, 'POST', { ...place, body: { ...form, note: 'landing measured again', revises: 1 } })

    const [now] = (await pdfOf(await call(kept, 'GET', place))).pages
    expect(now?.text).toContain('revision 2: landing measured again')
    expect(now?.text.toLowerCase()).not.toContain('superseded')
    const [before] = (await pdfOf(await call(kept, 'GET', { ...place, query: '?revision=1&paper=a4' }))).pages
    expect(before?.text.toLowerCase()).toContain('superseded')
    expect(before?.text).toContain('revision 2')
    expect(before?.width).toBeCloseTo(595.28, 1)

    expect((await call(kept, 'GET', { ...place, query: '?revision=3' })).status).toBe(404)
    const other = await newPerson('journeyman')
    expect((await call(kept, 'GET', { ...place, as: other })).status).toBe(404)
  })
})
