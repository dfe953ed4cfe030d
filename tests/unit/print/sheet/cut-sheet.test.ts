import { describe, expect, it } from 'vitest'
import { handrail } from '@/lib/calculators/field/handrail'
import type { Block, Sheet, Table } from '@/lib/print/sheet/sheet'
import { examplesOf } from '@/tests/support/examples'
import { lineText, printed, sheetText } from '@/tests/support/sheets'

const example = (id: string) => {
  const found = examplesOf('handrail').find((one) => one.id === id)
  if (!found) throw new Error(`No example ${id}`)
  return found.inputs
}
const tableOf = ({ blocks }: Sheet) => {
  const table = blocks.find((block): block is Block & Table => block.kind === 'table')
  if (!table) throw new Error('The sheet has no table')
  return table
}
const rows = (sheet: Sheet) =>
  tableOf(sheet).rows.map((cells) => cells.map(({ line, under = [] }) => [lineText(line), lineText(under)]))

describe('the cut sheet', () => {
  it('lists the parts in cutting order with both edges, blank, saw settings and faces', async () => {
    const [first, landing] = rows(await printed('handrail', handrail.example))
    expect(first).toEqual([
      ['A', 'rake'],
      ['1', ''],
      [`6'-6 1/4"`, '78.230'],
      [`6'-5 3/4"`, '77.738'],
      [`6'-6 1/4"`, '78.230'],
      ['square', ''],
      ['16 1/2° top top', '16.53° exactly'],
      ['–', ''],
      ['', ''],
      ['', ''],
    ])
    expect(landing?.[7]).toEqual(['SLIDE', ''])
  })

  it('reads the saw as the reader has it: 90 at square', async () => {
    const sheet = await printed('handrail', handrail.example, { preferences: { sawSquare: 90 } })
    expect(rows(sheet)[0]?.[6]).toEqual(['73 1/2° top top', '73.47° exactly'])
    expect(sheetText(sheet)).toContain('Saw 90 = square')
  })

  it('has two boxes to tick for every part and return', async () => {
    const sheet = await printed('handrail', example('composite-12-field-brackets-and-returns'))
    const table = tableOf(sheet)
    expect(table.rows).toHaveLength(4)
    for (const cells of table.rows) expect(cells.filter(({ box }) => box)).toHaveLength(2)
  })

  it('says the quarter turn of a plan cut, and how a return lies', async () => {
    const sheet = await printed('handrail', example('composite-12-field-brackets-and-returns'))
    const [part, , bottom, top] = rows(sheet)
    expect(part?.[5]).toEqual(['45° in plan', 'long on room side'])
    expect(part?.[7]).toEqual(['TURN', ''])
    expect(bottom?.[0]).toEqual(['Ar', 'return'])
    expect(bottom?.[7]).toEqual(['RAKE', '32.47°'])
    expect(top?.[7]).toEqual(['–', ''])
    const key = lineText(tableOf(sheet).key ?? [])
    expect(key).toContain('TURN: turn the stock a quarter between cuts')
    expect(key).toContain('A, B: long on room side by one rail width for the return')
  })

  it('keeps the numbers of brackets taped on the stair, and shouts of one at a joint', async () => {
    const said = sheetText(await printed('handrail', example('composite-12-field-brackets-and-returns')))
    expect(said.some((line) => /^1: .* 4: .* too close to a joint$/.test(line))).toBe(true)
    expect(said).toContain('Bracket 4 is too close to a knuckle of part A.')
  })

  it('leaves blanks to write on where nothing is known', async () => {
    const said = sheetText(await printed('handrail', handrail.example))
    expect(said).toContain(`Measured ${'_'.repeat(12)}`)
    expect(said).toContain(`Checked by ${'_'.repeat(11)} blank = DO NOT CUT`)
    expect(said).toContain('closing check within 0"')
  })

  it('names the flight whose tapes do not close', async () => {
    const [one, two] = handrail.example.flights as readonly Record<string, string>[]
    const flights = [{ ...one, nosingRake: '66' }, two]
    const said = sheetText(await printed('handrail', { ...handrail.example, flights }))
    expect(said.find((line) => line.startsWith('Flight 1'))).toMatch(/Measure again: .* do not close by 13\/16"/)
  })

  it('says job, sheet, revision, what changed, and what stands in its place', async () => {
    const kept = { sheet: 2, revision: 1, note: 'first measure', supersededBy: 3 }
    const head = { job: 'Quarry Street walk-up', sheet: 'Stoop rail', place: 'rear', kept }
    const sheet = await printed('handrail', handrail.example, { head })
    expect(sheet.title).toBe('Quarry Street walk-up')
    expect(sheet.under).toBe('Stoop rail · rear · sheet 2 · revision 1: first measure')
    expect(sheet.supersededBy).toBe(3)
  })

  it.each(examplesOf('handrail').map(({ id, inputs }) => [id, inputs] as const))(
    'carries every bracket, joint and stick of %s',
    async (_id, inputs) => {
      const sheet = await printed('handrail', inputs)
      const said = sheetText(sheet).join('\n')
      for (const [mark] of rows(sheet)) expect(mark?.[0]).toMatch(/^[A-Z]r?$/)
      expect(said).toContain('Sticks: ')
      expect(said).toMatch(/hold|Hold|the rail is one piece/)
      expect(sheet.hand).toBe(inputs.hand)
    },
  )
})
