import { describe, expect, it } from 'vitest'
import { changesOf, inputLeaves, outputLeaves } from '@/components/job/compare'
import { computeCalculator } from '@/lib/calculators/compute'
import { handrail } from '@/lib/calculators/field/handrail'
import { defaultPrecision } from '@/lib/calculators/fields'
import { plainRail } from '@/tests/support/plain-rail'

async function sheetOf(changed: object) {
  const computed = await computeCalculator('handrail', { ...plainRail, ...changed })
  if (!computed.ok) throw new Error(JSON.stringify(computed.errors))
  return computed.answer
}

const measured = (sheet: { inputs: object }) => inputLeaves(handrail.inputs, sheet.inputs)
const cut = (sheet: { outputs: object }) => outputLeaves(handrail.outputs, sheet.outputs)

describe('two revisions of a sheet', () => {
  it('say nothing when they are the same', async () => {
    const sheet = await sheetOf({})
    expect(measured(sheet).length).toBeGreaterThan(5)
    expect(changesOf(measured(sheet), measured(sheet), defaultPrecision)).toEqual([])
    expect(changesOf(cut(sheet), cut(sheet), defaultPrecision)).toEqual([])
  })

  it('name what was measured differently, old beside new', async () => {
    const [was, is] = await Promise.all([sheetOf({}), sheetOf({ railHeight: 37 })])
    const [change, ...others] = changesOf(measured(was), measured(is), defaultPrecision)
    expect(others).toEqual([])
    expect(change).toMatchObject({ label: 'Rail height', before: { value: 36 }, after: { value: 37 } })
  })

  it('name parts by their marks, and leave out what reads the same on the tape', async () => {
    const longer = { top: { type: 'level', length: 12.25 } }
    const hair = { top: { type: 'level', length: 12.001 } }
    const [was, is, nearly] = await Promise.all([
      sheetOf({ top: { type: 'level', length: 12 } }),
      sheetOf(longer),
      sheetOf(hair),
    ])
    const labels = changesOf(cut(was), cut(is), defaultPrecision).map(({ label }) => label)
    expect(labels).toContain('Part B, top edge')
    expect(labels).not.toContain('Part A, top edge')
    expect(changesOf(cut(was), cut(nearly), defaultPrecision).map(({ label }) => label)).toEqual([])
  })

  it('show a part that one of them does not have', async () => {
    const [was, is] = await Promise.all([
      sheetOf({ top: { type: 'none' } }),
      sheetOf({ top: { type: 'level', length: 12 } }),
    ])
    const added = changesOf(cut(was), cut(is), defaultPrecision).filter(({ before }) => before === undefined)
    expect(added.map(({ label }) => label)).toContain('Part B, mark')
  })
})
