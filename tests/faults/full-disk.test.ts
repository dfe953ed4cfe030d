import { randomUUID } from 'node:crypto'
import { spawnSync } from 'node:child_process'
import { rmSync, statfsSync } from 'node:fs'
import path from 'node:path'
import { afterAll, describe, expect, it } from 'vitest'
import { endRun } from '@/scripts/test/runs'
import { Longpoint, newRun, removeRun } from '@/tests/support/longpoint'
import { Journeyman } from './journeyman'
import { rows } from './rows'

const directory = newRun()
const filler = path.join(directory, 'filler')
const mounted = spawnSync('mount', ['-t', 'tmpfs', '-o', 'size=640m,mode=700', 'tmpfs', directory]).status === 0
if (!mounted) console.warn('SKIPPED: the full-disk tests need a small disk, and only root may mount one here.')

afterAll(async () => {
  await endRun(directory)
  if (mounted) spawnSync('umount', ['-l', directory])
  await removeRun(directory)
})

/** Leave this many bytes of the disk free. */
function fill(leaving: number) {
  const { bavail, bsize } = statfsSync(directory)
  const bytes = Math.max(0, bavail * bsize - leaving)
  const made = spawnSync('fallocate', ['-l', String(bytes), filler])
  expect(made.status).toBe(0)
}

describe.skipIf(!mounted)('a full disk', () => {
  it('is said in a sentence that tells what to do, and nothing is started', async () => {
    fill(8 * 1024 * 1024)
    const longpoint = await Longpoint.launch({ directory })
    expect(await longpoint.ended).toBe(1)
    expect(longpoint.output).toMatch(/The disk that holds .* is full .* Make room there, or set LONGPOINT_DATA_DIR/)
    rmSync(filler)
  })

  it('refuses what it cannot keep, keeps what it acknowledged, and saves again once there is room', async () => {
    const first = await Longpoint.launch({ directory })
    const origin = await first.address()
    const journeyman = await Journeyman.at(origin)
    fill(0)
    const acknowledged = await saveUntilRefused(journeyman)
    rmSync(filler)

    await first.end('SIGTERM')
    const next = await Longpoint.launch({ directory, port: first.port })
    await next.address()
    const stored = await rows<{ id: string }>(next.databaseUrl(), 'SELECT id FROM jobs')
    expect(stored.map(({ id }) => id)).toEqual(expect.arrayContaining(acknowledged))
    await journeyman.insist('After the flood', randomUUID(), 10)
    await next.end('SIGTERM')
  })
})

/** Jobs with as much text as one takes, until one is refused. Gives the ids of those acknowledged. */
async function saveUntilRefused(journeyman: Journeyman): Promise<string[]> {
  const acknowledged: string[] = []
  const notes = 'rust '.repeat(799)
  for (let n = 1; n <= 20_000; n++) {
    const answer = await journeyman.makeJob(`Job ${n}`, randomUUID(), notes).catch(() => undefined)
    if (answer?.status !== 201) return acknowledged
    acknowledged.push(((await answer.json()) as { id: string }).id)
  }
  throw new Error('the disk never became full')
}
