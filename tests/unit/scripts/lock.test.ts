import { mkdtempSync, readdirSync, rmSync, statSync, writeFileSync } from 'node:fs'
import os from 'node:os'
import path from 'node:path'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { birthOf, identify } from '@/scripts/setup/identity.mjs'
import { holderOf, Lock } from '@/scripts/setup/lock.mjs'

let directory: string
beforeEach(() => (directory = mkdtempSync(path.join(os.tmpdir(), 'longpoint-lock-'))))
afterEach(() => rmSync(directory, { recursive: true }))

const record = (holder: object) => writeFileSync(path.join(directory, 'running.json'), JSON.stringify(holder))

describe('the lock of a data directory', () => {
  it('goes to the first who asks, and names it to the second', () => {
    expect(new Lock(directory).take()).toEqual({ leftovers: [] })
    expect(new Lock(directory).take()).toMatchObject({ heldBy: { pid: process.pid } })
    expect(readdirSync(directory)).toEqual(['running.json'])
  })

  it('is readable by its owner alone', () => {
    new Lock(directory).take()
    expect(statSync(path.join(directory, 'running.json')).mode & 0o777).toBe(0o600)
  })

  it('tells its address and its children to whoever asks', () => {
    const lock = new Lock(directory)
    lock.take()
    lock.announce('http://localhost:3000')
    lock.addChild('app', process.pid)
    expect(holderOf(directory)).toMatchObject({
      address: 'http://localhost:3000',
      children: { app: identify(process.pid) },
    })
  })

  it('passes from a dead holder with those of its children that still run, and no stranger of the same number', () => {
    const app = identify(process.pid)
    record({
      pid: process.pid,
      birth: 'another boot/1',
      children: { app, mariadb: { ...app, birth: 'another boot/2' } },
    })
    expect(new Lock(directory).take()).toEqual({ leftovers: [app] })
  })
})

describe('the birth of a process', () => {
  it('is known while it runs and gone with it', () => {
    expect(birthOf(process.pid)).toBe(birthOf(process.pid))
    expect(birthOf(process.pid)).not.toBe(birthOf(process.ppid))
    expect(birthOf(2 ** 22 + 1)).toBeUndefined()
  })
})
