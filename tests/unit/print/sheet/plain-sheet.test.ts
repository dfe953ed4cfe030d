import { describe, expect, it } from 'vitest'
import { computeCalculator } from '@/lib/calculators/compute'
import { calculatorIds, loadCalculator } from '@/lib/calculators/load'
import { printed, sheetText } from '@/tests/support/sheets'

describe.each(calculatorIds.filter((id) => id !== 'handrail'))('the sheet of %s', (id) => {
  it('names everything given and found, with the working and its sources', async () => {
    const calculator = await loadCalculator(id)
    const sheet = await printed(id, calculator.example)
    const said = sheetText(sheet)
    for (const name of Object.keys(calculator.example)) {
      const label = calculator.inputs[name]?.label ?? ''
      expect(said.some((line) => line.startsWith(label))).toBe(true)
    }
    const computed = await computeCalculator(id, calculator.example)
    if (!computed.ok) throw new Error('the example must solve')
    for (const name of calculator.glance) {
      const output = calculator.outputs[name]
      const solved = computed.answer.outputs[name] ?? null
      if (output?.kind === 'value' && solved !== null) expect(said).toContain(output.label)
    }
    expect(said).toEqual(expect.arrayContaining(calculator.sources.map(({ where }) => where)))
    expect(sheet.blocks.some(({ kind }) => kind === 'picture')).toBe(true)
  })
})

describe('the sheet of a calculation', () => {
  it('shows what was given to the letter, not rounded to the tape', async () => {
    const said = sheetText(await printed('tape-math', { decimalIn: '143.3527' }))
    expect(said).toContain('143.3527 in')
    expect(said).toContain(`11'-11 3/8"`)
  })

  it('sets the signal word before each caution that stands', async () => {
    const said = sheetText(await printed('cut-list', { pieces: ['60', '48'], stock: '240', kerf: '1/16' }))
    expect(said.filter((line) => line.startsWith('NOTICE '))).toHaveLength(4)
  })

  it('lists the bars of a cut list a row each', async () => {
    const said = sheetText(await printed('cut-list', { pieces: ['150', '150', '60'], stock: '240', kerf: '1/16' }))
    expect(said).toContain('Bar 1')
    expect(said).toContain('Bar 2')
    expect(said).toContain(`12'-6" · 5'-0"`)
  })
})
