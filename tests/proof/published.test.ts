import { readdir } from 'node:fs/promises'
import { describe, expect, it } from 'vitest'
import { calculatorIds, loadCalculator } from '@/lib/calculators/load'
import { outputAt } from '@/lib/proof/path'
import { readProof } from '@/lib/proof/read'
import { compareRow } from '@/lib/proof/rows'

const files = await Promise.all(calculatorIds.map(async (id) => ({ id, rows: await readProof(id) })))

describe.each(files.filter(({ rows }) => rows.length > 0))('$id against print', ({ id, rows }) => {
  it.each(rows.map((row) => [`${row.id}: ${row.quantity}`, row] as const))('%s', async (_name, row) => {
    const { agrees, difference } = await compareRow(id, row)
    const wanted = row.printIsWrong === undefined
    expect(agrees, `off by ${difference}, printed precision ${row.tolerance}`).toBe(wanted)
  })

  it('names source, section and provenance beside every value, and an output that exists', async () => {
    const { outputs } = await loadCalculator(id)
    for (const row of rows) {
      for (const part of [row.source, row.where, row.provenance]) expect(part, row.id).not.toBe('')
      expect(outputAt(outputs, row.output)?.kind, row.output).toBe('value')
    }
    expect(new Set(rows.map((row) => row.id)).size).toBe(rows.length)
  })
})

it('holds the calculators against more than a hundred printed values', () => {
  const computed = files.flatMap(({ rows }) => rows).filter(({ kind }) => kind === 'computed')
  expect(computed.length).toBeGreaterThan(100)
})

it('stands for calculators of the handbook, each under its own name', async () => {
  const named = (await readdir('content/proof')).map((file) => file.replace(/\.json$/, ''))
  expect(calculatorIds).toEqual(expect.arrayContaining(named))
})
