// @ts-check
import { spawnSync } from 'node:child_process'
import { existsSync, readFileSync } from 'node:fs'

/**
 * When a running process began, in words no later process with the same number repeats.
 * Undefined when it is gone: a zombie has nothing left to stop.
 * @param {number} pid
 * @returns {string | undefined}
 */
export function birthOf(pid) {
  if (!existsSync('/proc/self/stat')) return birthFromPs(pid)
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, 'utf8')
    // The name in brackets may hold spaces: count from the last bracket. Field 3 is the state, 22 the start.
    const fields = stat.slice(stat.lastIndexOf(')') + 2).split(' ')
    return fields[0] === 'Z' ? undefined : `${bootId()}/${fields[19]}`
  } catch {
    return undefined
  }
}

/** @param {{ pid: number, birth: string }} process recorded earlier */
export function isSameProcess({ pid, birth }) {
  return birthOf(pid) === birth
}

/** @param {number} pid */
export function identify(pid) {
  return { pid, birth: birthOf(pid) ?? 'gone' }
}

function bootId() {
  return readFileSync('/proc/sys/kernel/random/boot_id', 'utf8').trim()
}

/** @param {number} pid */
function birthFromPs(pid) {
  const { stdout } = spawnSync('ps', ['-o', 'lstart=', '-p', String(pid)], { encoding: 'utf8' })
  return stdout.trim() || undefined
}
