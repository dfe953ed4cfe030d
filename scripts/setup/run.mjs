// @ts-check
import { spawn } from 'node:child_process'
import { defer } from './cleanup.mjs'
import { Stop } from './stop.mjs'

const keptLines = 25

/**
 * Run a command to its end and give back what it printed. Ends with this process.
 * @param {string} command
 * @param {readonly string[]} args
 * @param {{ env?: NodeJS.ProcessEnv, cwd?: string }} [options]
 * @returns {Promise<{ code: number, output: string }>} code 127 when the command is not there
 */
export function run(command, args, options = {}) {
  return new Promise((resolve) => {
    // A group of its own: a command that is cut short takes along whatever it started in turn.
    const child = spawn(command, args, { stdio: ['ignore', 'pipe', 'pipe'], detached: true, ...options })
    const forget = defer(() => endGroup(child))
    let output = ''
    const keep = (/** @type {Buffer} */ chunk) => (output += chunk.toString())
    child.stdout.on('data', keep)
    child.stderr.on('data', keep)
    const end = (/** @type {number} */ code) => void forget().then(() => resolve({ code, output }))
    child.on('error', (error) => {
      output += error.message
      end(127)
    })
    child.on('close', (code) => end(code ?? 1))
  })
}

/**
 * SIGTERM to a command and everything in its group; returns when the command itself is gone.
 * @param {import('node:child_process').ChildProcess} leader
 * @returns {Promise<void>}
 */
export function endGroup(leader) {
  return new Promise((resolve) => {
    if (leader.pid === undefined || leader.exitCode !== null || leader.signalCode !== null) return resolve()
    leader.once('exit', () => resolve())
    process.kill(-leader.pid, 'SIGTERM')
  })
}

/**
 * Run a command that has to succeed.
 * @param {string} sentence what to say and do when it does not
 * @param {string} command
 * @param {readonly string[]} args
 * @param {{ env?: NodeJS.ProcessEnv, cwd?: string }} [options]
 * @returns {Promise<string>} what it printed
 * @throws {Stop} with the end of what it printed
 */
export async function mustRun(sentence, command, args, options) {
  const { code, output } = await run(command, args, options)
  if (code !== 0) throw new Stop(sentence, lastLines(output))
  return output
}

/**
 * @param {string} text
 * @param {number} [count]
 */
export function lastLines(text, count = keptLines) {
  return text.trimEnd().split('\n').slice(-count).join('\n')
}
