import { createHash } from 'node:crypto'
import { readFileSync, writeFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { computeCalculator } from '@/lib/calculators/compute'
import { calculatorIds } from '@/lib/calculators/load'
import { examplesOf } from '../../support/examples'

/** Answers to the worked examples by id and revision; LONGPOINT_FREEZE=1 writes those not yet there. */
const path = new URL('./frozen.json', import.meta.url)
const frozen = JSON.parse(readFileSync(path, 'utf8')) as Record<string, string>
const freezing = process.env.LONGPOINT_FREEZE === '1'

/** Nine digits: enough to see a change, few enough not to see another machine's last bit. */
const rounded = (_name: string, value: unknown) => (typeof value === 'number' ? Number(value.toPrecision(9)) : value)

async function fingerprint(id: string): Promise<{ key: string; hash: string }> {
  const answers = await Promise.all(examplesOf(id).map(({ inputs }) => computeCalculator(id, inputs)))
  const outputs = answers.map((answered) => (answered.ok ? answered.answer.outputs : answered.errors))
  const revision = answers.map((answered) => (answered.ok ? answered.answer.revision : 0))[0] ?? 0
  const hash = createHash('sha256').update(JSON.stringify(outputs, rounded)).digest('hex')
  return { key: `${id}@${revision}`, hash }
}

describe.each(calculatorIds)('%s', (id) => {
  it('answers as it did when its revision was given', async () => {
    const { key, hash } = await fingerprint(id)
    if (freezing && !(key in frozen)) {
      frozen[key] = hash
      writeFileSync(path, `${JSON.stringify(frozen, null, 2)}\n`)
    }
    expect(frozen[key], `${key} has no frozen answers, or they changed and the revision did not`).toBe(hash)
  })
})
