import { spawn } from 'node:child_process'
import type { ChildProcess } from 'node:child_process'
import { openSync, closeSync } from 'node:fs'
import { setTimeout as wait } from 'node:timers/promises'
import { isSameProcess } from './identity.mjs'
import type { Identity } from './lock.mjs'

export interface ServiceSpec {
  name: string
  command: string
  args: readonly string[]
  env: NodeJS.ProcessEnv
  /** What it prints goes to this file, or to our own output. */
  log: string | 'inherit'
  /** How long it may take to end by itself after SIGTERM. */
  graceMs: number
  /** Called with the number of each process started, so that a later start can find it. */
  record?: (pid: number) => void
}

type Probe = () => Promise<boolean>

const failuresAllowed = 5
const revivedWithinMs = 60_000

/** A program that runs beside us in a process group of its own, so that Ctrl-C reaches only us and we end it in order. */
export class Service {
  #child: ChildProcess
  #ended: Promise<void>
  #stopping = false

  constructor(readonly spec: ServiceSpec) {
    this.#child = this.#launch()
    this.#ended = endOf(this.#child)
  }

  get hasEnded(): boolean {
    return this.#child.pid === undefined || this.#child.exitCode !== null || this.#child.signalCode !== null
  }

  /** Ask until it answers. False when it ended first, or when the time is over. */
  async answers(probe: Probe, timeoutMs: number): Promise<boolean> {
    const until = Date.now() + timeoutMs
    while (!this.hasEnded && Date.now() < until) {
      if (await probe()) return true
      await wait(100)
    }
    return false
  }

  /** From now on start it again whenever it dies. Returns when it was stopped, or would not come up five times running. */
  async keepAlive(probe: Probe): Promise<void> {
    for (let failures = 0; failures < failuresAllowed;) {
      await this.#ended
      await wait(failures * 500)
      if (this.#stopping) return
      process.stderr.write(`${this.spec.name} ended unexpectedly: starting it again.\n`)
      this.#child = this.#launch()
      this.#ended = endOf(this.#child)
      failures = (await this.answers(probe, revivedWithinMs)) ? 0 : failures + 1
    }
  }

  /** SIGTERM, then SIGKILL to the whole group when the grace is over. Returns when it is gone. */
  async stop() {
    this.#stopping = true
    if (this.#child.pid === undefined) return
    if (!this.hasEnded) {
      this.#child.kill('SIGTERM')
      await Promise.race([this.#ended, wait(this.spec.graceMs, undefined, { ref: false })])
    }
    // The leader's number stays taken as long as its group lives, so this reaches ours or nobody.
    signalGroup(this.#child.pid, 'SIGKILL')
  }

  #launch(): ChildProcess {
    const { command, args, env, log, record, name } = this.spec
    const output = log === 'inherit' ? 'inherit' : openSync(log, 'a', 0o600)
    const child = spawn(command, args, { env, detached: true, stdio: ['ignore', output, output] })
    if (typeof output === 'number') closeSync(output)
    if (child.pid !== undefined) record?.(child.pid)
    child.on('error', (error) => process.stderr.write(`${name}: ${error.message}\n`))
    return child
  }
}

function endOf(child: ChildProcess): Promise<void> {
  return new Promise((resolve) => {
    child.once('exit', () => resolve())
    child.once('error', () => resolve())
  })
}

/** End processes that a killed start left behind: SIGTERM, then SIGKILL when the grace is over. */
export async function endLeftovers(leftovers: readonly Identity[], graceMs: number) {
  await Promise.all(
    leftovers.map(async (leftover) => {
      if (!isSameProcess(leftover)) return
      process.kill(leftover.pid, 'SIGTERM')
      const until = Date.now() + graceMs
      while (isSameProcess(leftover) && Date.now() < until) await wait(50)
      if (!isSameProcess(leftover)) return
      process.kill(leftover.pid, 'SIGKILL')
      signalGroup(leftover.pid, 'SIGKILL')
      while (isSameProcess(leftover)) await wait(20)
    }),
  )
}

/** Every process of the group this one leads. A group that is gone is what we wanted. */
function signalGroup(leader: number, signal: NodeJS.Signals) {
  try {
    process.kill(-leader, signal)
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code !== 'ESRCH') throw error
  }
}
