import { readdirSync, readFileSync } from 'node:fs'

/** Numbers of the processes that run with this data directory, however deep they were started from one another. */
export function processesWith(directory: string): number[] {
  return readdirSync('/proc')
    .map(Number)
    .filter((pid) => pid > 0 && pid !== process.pid && environmentOf(pid).includes(`LONGPOINT_DATA_DIR=${directory}`))
}

function environmentOf(pid: number): string[] {
  try {
    return readFileSync(`/proc/${pid}/environ`, 'utf8').split('\0')
  } catch {
    return []
  }
}
