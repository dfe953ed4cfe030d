// @ts-check
import { linkSync, mkdirSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs'
import path from 'node:path'
import { defer } from './cleanup.mjs'
import { birthOf, identify, isSameProcess } from './identity.mjs'

/** @typedef {{ pid: number, birth: string }} Identity */
/** @typedef {Identity & { address?: string, children: Record<string, Identity> }} Holder */

/**
 * One process at a time for one data directory: a file that names its holder and the holder's children.
 * What a killed holder left running is found by number and start time, never by number alone.
 */
export class Lock {
  /** @type {Holder} */
  #holder = { ...identify(process.pid), children: {} }
  /** @type {string} */
  #file

  /** @param {string} directory made when missing, readable by its owner alone */
  constructor(directory) {
    mkdirSync(directory, { recursive: true, mode: 0o700 })
    this.#file = path.join(directory, 'running.json')
  }

  /**
   * @returns {{ heldBy: Holder } | { leftovers: Identity[] }} who holds it, or what a dead holder left running
   */
  take() {
    const mine = `${this.#file}.${process.pid}`
    writeFileSync(mine, JSON.stringify(this.#holder), { mode: 0o600 })
    try {
      return this.#link(mine)
    } finally {
      rmSync(mine, { force: true })
    }
  }

  /** @param {string} mine @returns {{ heldBy: Holder } | { leftovers: Identity[] }} */
  #link(mine) {
    /** @type {Identity[]} */
    let leftovers = []
    for (;;) {
      try {
        linkSync(mine, this.#file)
        defer(() => rmSync(this.#file, { force: true }))
        return { leftovers }
      } catch (error) {
        if (/** @type {NodeJS.ErrnoException} */ (error).code !== 'EEXIST') throw error
      }
      const holder = readHolder(this.#file)
      if (holder && isSameProcess(holder)) return { heldBy: holder }
      leftovers = leftovers.concat(this.#clear(holder))
    }
  }

  /**
   * Move a dead holder's file away. Two starters may try at once: whoever finds the other's fresh file puts it back.
   * @param {Holder | undefined} dead
   * @returns {Identity[]}
   */
  #clear(dead) {
    const aside = `${this.#file}.stale.${process.pid}`
    try {
      renameSync(this.#file, aside)
    } catch {
      return []
    }
    const moved = readHolder(aside)
    if (moved && moved.pid !== dead?.pid && isSameProcess(moved)) linkSync(aside, this.#file)
    rmSync(aside, { force: true })
    return dead ? Object.values(dead.children).filter((child) => birthOf(child.pid) === child.birth) : []
  }

  /** @param {string} address where the app answers, for the sentence a second start prints */
  announce(address) {
    this.#holder.address = address
    this.#write()
  }

  /** @param {string} name @param {number} pid */
  addChild(name, pid) {
    this.#holder.children[name] = identify(pid)
    this.#write()
  }

  #write() {
    const next = `${this.#file}.next`
    writeFileSync(next, JSON.stringify(this.#holder), { mode: 0o600 })
    renameSync(next, this.#file)
  }
}

/** Who holds a data directory now, if anybody alive does. @param {string} directory */
export function holderOf(directory) {
  const holder = recordedIn(directory)
  return holder && isSameProcess(holder) ? holder : undefined
}

/** Who held a data directory last, alive or not. @param {string} directory */
export function recordedIn(directory) {
  return readHolder(path.join(directory, 'running.json'))
}

/** @param {string} file @returns {Holder | undefined} undefined when missing or cut short by a full disk */
function readHolder(file) {
  try {
    return JSON.parse(readFileSync(file, 'utf8'))
  } catch {
    return undefined
  }
}
