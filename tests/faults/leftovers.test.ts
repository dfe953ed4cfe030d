import { spawn } from 'node:child_process'
import type { ChildProcess } from 'node:child_process'
import { writeFileSync } from 'node:fs'
import path from 'node:path'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { birthOf } from '@/scripts/setup/identity.mjs'
import { Longpoint, newRun, removeRun } from '@/tests/support/longpoint'
import { processesWith } from './processes'

let directory: string
let stranger: ChildProcess

beforeEach(() => {
  directory = newRun()
  stranger = spawn('sleep', ['600'], { stdio: 'ignore' })
})

afterEach(async () => {
  stranger.kill('SIGKILL')
  await removeRun(directory)
})

describe('a start after one that was killed', () => {
  it('ends what the killed one left running, and runs again on the same data', async () => {
    const killed = await Longpoint.launch({ directory })
    await killed.address()
    const orphans = [killed.pidOf('app'), killed.pidOf('mariadb')]
    await killed.kill()
    expect(orphans.map(birthOf)).not.toContain(undefined)

    const next = await Longpoint.launch({ directory, port: killed.port })
    expect((await fetch(await next.address())).status).toBe(200)

    expect(orphans.map(birthOf)).toEqual([undefined, undefined])
    await next.end('SIGTERM')
    expect(processesWith(directory)).toEqual([])
  })

  it('recovers a database that was killed in the middle of being made', async () => {
    const killed = await Longpoint.launch({ directory })
    while (!killed.output.includes('Making an empty database')) await new Promise((resolve) => setTimeout(resolve, 5))
    await killed.kill()

    const next = await Longpoint.launch({ directory })
    expect((await fetch(await next.address())).status).toBe(200)
    await next.end('SIGTERM')
  })

  it('takes over a stale lock, and leaves alone a stranger who was given an old number', async () => {
    const number = stranger.pid ?? 0
    const recycled = { pid: number, birth: 'another boot/1' }
    writeFileSync(path.join(directory, 'running.json'), JSON.stringify({ ...recycled, children: { app: recycled } }))

    const longpoint = await Longpoint.launch({ directory })
    expect((await fetch(await longpoint.address())).status).toBe(200)

    expect(birthOf(number)).toBeDefined()
    await longpoint.end('SIGTERM')
    expect(birthOf(number)).toBeDefined()
  })

  it('takes over a lock that a full disk cut short', async () => {
    writeFileSync(path.join(directory, 'running.json'), '{"pid": 12')
    const longpoint = await Longpoint.launch({ directory })
    expect((await fetch(await longpoint.address())).status).toBe(200)
    await longpoint.end('SIGTERM')
  })
})
