import { existsSync, readdirSync, rmSync } from 'node:fs'
import path from 'node:path'
import { defer } from '../setup/cleanup.mjs'
import { recordedIn } from '../setup/lock.mjs'
import { endLeftovers } from '../setup/service'

/** Where tests that start Longpoint keep its data, a directory a run. */
export const runsIn = (directory: string) => path.join(directory, 'runs')

/** Begin with no run of an earlier, killed test; end with none of this one, however it ends. */
export async function clearRuns(directory: string) {
  await endRuns(directory)
  defer(() => endRuns(directory))
}

/** Stop whatever the runs still have going, and remove their data. */
export async function endRuns(directory: string) {
  const runs = runsIn(directory)
  if (!existsSync(runs)) return
  for (const name of readdirSync(runs)) await endRun(path.join(runs, name))
  rmSync(runs, { recursive: true, force: true })
}

/** The start first, so that it does not revive what it watches; then what it could not end itself. */
export async function endRun(run: string) {
  const recorded = recordedIn(run)
  if (!recorded) return
  await endLeftovers([recorded], 10_000)
  await endLeftovers(Object.values(recorded.children), 10_000)
}
