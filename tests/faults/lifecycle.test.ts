import { existsSync } from 'node:fs'
import path from 'node:path'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { Longpoint, newRun, removeRun } from '@/tests/support/longpoint'
import { processesWith } from './processes'

/** One that runs beside all the others here, and must never notice them. */
let bystander: Longpoint
let bystanderAddress: string
const runs: string[] = []

function run() {
  const directory = newRun()
  runs.push(directory)
  return directory
}

beforeAll(async () => {
  bystander = await Longpoint.launch({ directory: run() })
  bystanderAddress = await bystander.address()
})

afterAll(async () => {
  for (const directory of runs) await removeRun(directory)
})

const answers = async (address: string) => (await fetch(address)).status

describe('npm start', () => {
  it.each(['SIGINT', 'SIGTERM'] as const)('ends all it started, and nothing else, on %s', async (signal) => {
    const directory = run()
    const longpoint = await Longpoint.launch({ directory })
    expect(await answers(await longpoint.address())).toBe(200)
    expect(processesWith(directory).length).toBeGreaterThanOrEqual(3)

    expect(await longpoint.end(signal)).toBe(signal === 'SIGINT' ? 130 : 143)

    expect(processesWith(directory)).toEqual([])
    expect(existsSync(path.join(directory, 'running.json'))).toBe(false)
    expect(await answers(bystanderAddress)).toBe(200)
  })

  it('ends cleanly while it is still setting up', async () => {
    const directory = run()
    const longpoint = await Longpoint.launch({ directory })
    while (!longpoint.output.includes('Starting MariaDB: done')) await new Promise((resolve) => setTimeout(resolve, 20))
    expect(await longpoint.end('SIGINT')).toBe(130)
    expect(processesWith(directory)).toEqual([])
  })

  it('says where the first one runs when it is started twice', async () => {
    const second = await Longpoint.launch({ directory: bystander.directory })
    expect(await second.ended).toBe(1)
    expect(second.output).toContain(`is running already at ${bystanderAddress} (process ${bystander.process.pid})`)
    expect(await answers(bystanderAddress)).toBe(200)
  })

  it('names a free port and the command for it when its port is taken', async () => {
    const second = await Longpoint.launch({ directory: run(), port: bystander.port })
    expect(await second.ended).toBe(1)
    expect(second.output).toContain(`Port ${bystander.port} is in use`)
    expect(second.output).toMatch(/PORT=\d+ npm start/)
  })

  it('takes the next free port with --any-port', async () => {
    const second = await Longpoint.launch({ directory: run(), port: bystander.port, flags: ['--any-port'] })
    const address = await second.address()
    expect(Number(new URL(address).port)).toBeGreaterThan(bystander.port)
    expect(await answers(address)).toBe(200)
    expect(await second.end('SIGTERM')).toBe(143)
  })

  it('lets no other machine in while letters reach nobody', async () => {
    const open = await Longpoint.launch({ directory: run(), env: { HOST: '0.0.0.0' } })
    expect(await open.ended).toBe(1)
    expect(open.output).toContain('Set SMTP_URL first')
  })

  it('lets no other machine in while the demo sign-ins exist', async () => {
    await bystander.end('SIGTERM')
    const env = { HOST: '0.0.0.0', SMTP_URL: 'smtp://127.0.0.1:2525', APP_ORIGIN: 'https://longpoint.example' }
    const open = await Longpoint.launch({ directory: bystander.directory, env })
    expect(await open.ended).toBe(1)
    expect(open.output).toContain('has the demo sign-ins')
    expect(processesWith(bystander.directory)).toEqual([])
  })
})
