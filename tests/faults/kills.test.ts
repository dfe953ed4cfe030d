import { randomUUID } from 'node:crypto'
import { setTimeout as wait } from 'node:timers/promises'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { Longpoint, newRun, removeRun } from '@/tests/support/longpoint'
import { Journeyman } from './journeyman'
import { rows } from './rows'

const kills = process.env.LONGPOINT_FULL ? 100 : 10
/** A tenth of a second apart: whatever was killed has to be back, unaided, within this many. */
const tries = 30

const directory = newRun()
let longpoint: Longpoint
let journeyman: Journeyman

beforeAll(async () => {
  longpoint = await Longpoint.launch({ directory })
  journeyman = await Journeyman.at(await longpoint.address())
})

afterAll(() => removeRun(directory))

const jobsNamed = (name: string) =>
  rows<{ id: string }>(longpoint.databaseUrl(), 'SELECT id FROM jobs WHERE name = ?', [name])

/** Keep making jobs until told to stop; every acknowledged one is noted by its name. */
async function keepSaving(writer: number, until: AbortSignal): Promise<Map<string, string>> {
  const acknowledged = new Map<string, string>()
  for (let n = 1; !until.aborted; n++) {
    const name = `Writer ${writer}, job ${n}`
    acknowledged.set(name, await journeyman.insist(name, randomUUID(), tries))
  }
  return acknowledged
}

describe('the database killed while people save', () => {
  it(`loses no acknowledged job in ${kills} kills, saves none twice, and is reached again unaided`, async () => {
    const stop = new AbortController()
    const writers = [1, 2, 3].map((writer) => keepSaving(writer, stop.signal))
    // A writer that gives up ends the test at once, not after the last kill.
    const killing = killDatabase().finally(() => stop.abort())
    const [acknowledged] = await Promise.all([Promise.all(writers), killing])

    const stored = await rows<{ id: string; name: string }>(
      longpoint.databaseUrl(),
      'SELECT id, name FROM jobs WHERE name LIKE ?',
      ['Writer %'],
    )
    const promised = new Map(acknowledged.flatMap((map) => [...map]))
    expect(promised.size).toBeGreaterThan(kills)
    expect(new Map(stored.map(({ name, id }) => [name, id]))).toEqual(promised)
    expect(stored.length).toBe(promised.size)
  })

  it('leaves no half of a save: as many audit rows as jobs', async () => {
    const [counted] = await rows<{ jobs: bigint; audited: bigint }>(
      longpoint.databaseUrl(),
      "SELECT (SELECT COUNT(*) FROM jobs) jobs, (SELECT COUNT(*) FROM audit_events WHERE action = 'job.created') audited",
    )
    expect(counted?.jobs).toBeGreaterThan(0)
    expect(counted?.audited).toBe(counted?.jobs)
  })
})

const answers = () =>
  rows(longpoint.databaseUrl(), 'SELECT 1').then(
    () => true,
    () => false,
  )

async function killDatabase() {
  for (let n = 0; n < kills; n++) {
    // One that is killed before it ever answers was never up: five of those running are a broken database, and given up.
    while (!(await answers())) await wait(50)
    await wait(Math.random() * 400)
    const before = longpoint.pidOf('mariadb')
    process.kill(before, 'SIGKILL')
    // The next kill is for the next process.
    while (longpoint.pidOf('mariadb') === before) await wait(20)
  }
}

describe('the app killed between save and answer', () => {
  it(`makes one job of a request that is repeated with its key, ${kills} times`, async () => {
    let savedUnheard = 0
    for (let round = 0; round < kills; round++) {
      const name = `Round ${round}`
      const key = randomUUID()
      await killDuring(journeyman.makeJob(name, key), round)
      if ((await jobsNamed(name)).length > 0) savedUnheard++

      const id = await journeyman.insist(name, key, tries * 2)
      expect(await jobsNamed(name)).toEqual([{ id }])
    }
    // Rounds killed before the save prove only half: some have to have been saved and not heard of.
    expect(savedUnheard).toBeGreaterThan(0)
  })
})

/** Kill the app at the first byte of its answer, which nobody then reads, or somewhere before it. */
async function killDuring(request: Promise<Response>, round: number) {
  const answered = request.then(
    () => undefined,
    () => undefined,
  )
  await (round % 2 === 0 ? answered : Promise.race([answered, wait(Math.random() * 25)]))
  const before = longpoint.pidOf('app')
  process.kill(before, 'SIGKILL')
  while (longpoint.pidOf('app') === before) await wait(20)
  await answered
}
