// @ts-check
import { existsSync, statfsSync } from 'node:fs'
import path from 'node:path'
import { isUnwinding, unwind, unwindOnSignals } from './cleanup.mjs'
import { Stop } from './stop.mjs'

const fullBelowBytes = 32 * 1024 * 1024

/** Where everything Longpoint keeps on this machine lies: LONGPOINT_DATA_DIR, or .data. */
export function dataDirectory() {
  return path.resolve(process.env.LONGPOINT_DATA_DIR || '.data')
}

/**
 * Run a command of package.json: undo everything it began however it ends, say failures in sentences,
 * and leave with 0, with the code it returns, or with 1.
 * @param {() => Promise<number>} main
 */
export async function enter(main) {
  process.chdir(path.resolve(import.meta.dirname, '../..'))
  unwindOnSignals()
  let code = 1
  try {
    code = await main()
  } catch (error) {
    if (!isUnwinding()) process.stderr.write(`\n${explain(error)}\n`)
  }
  // A signal has its own way out, with its own code.
  if (isUnwinding()) return
  await unwind()
  process.exit(code)
}

/** @param {unknown} error */
function explain(error) {
  const { code, path: place = '' } = /** @type {NodeJS.ErrnoException} */ (error)
  const full = code === 'ENOSPC' || diskIsFull()
  const shown = error instanceof Stop && error.detail ? `\n\n${error.detail}` : ''
  if (full) return `${fullDisk()}${error instanceof Stop ? `\n(${error.message})` : ''}`
  if (code === 'EACCES' || code === 'EPERM' || code === 'EROFS')
    return `Longpoint may not write ${place}. Give this account the right to write there, or set LONGPOINT_DATA_DIR to a directory it may write.`
  if (error instanceof Stop) return `${error.message}${shown}`
  return error instanceof Error ? (error.stack ?? error.message) : String(error)
}

function diskIsFull() {
  return freeBytes() < fullBelowBytes
}

/** What the sentence about a full disk says: where, and how much is left. */
export function fullDisk() {
  const free = Math.floor(freeBytes() / 1024 / 1024)
  return `The disk that holds ${dataDirectory()} is full (${free} MB free). Make room there, or set LONGPOINT_DATA_DIR to a directory on another disk, and run this again: nothing saved is lost.`
}

/** Bytes an ordinary account may still write where the data lies, or will lie. */
export function freeBytes() {
  let directory = dataDirectory()
  while (!existsSync(directory)) directory = path.dirname(directory)
  const { bavail, bsize } = statfsSync(directory)
  return bavail * bsize
}
