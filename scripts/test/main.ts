import { step } from '../setup/progress.mjs'
import { endLeftovers } from '../setup/service'
import type { Identity, Lock } from '../setup/lock.mjs'
import { runChecks } from './checks'
import { readPlan } from './plan'
import type { Plan, Suite } from './plan'
import { clearRuns, endRuns } from './runs'
import { Stage } from './stage'
import { runSuite } from './suite'
import { oneFailed, sum, totalsLine } from './totals'
import type { Totals } from './totals'

interface Beginning {
  lock: Lock
  /** `.data/test`: the tests' database, the runs of fault tests, reports. */
  directory: string
  leftovers: Identity[]
  flags: readonly string[]
}

/** Everything `npm test` does once the packages are there. Gives 1 when anything failed. */
export async function test({ lock, directory, leftovers, flags }: Beginning): Promise<number> {
  const plan = readPlan(flags)
  if (leftovers.length > 0) await step('Ending what killed tests left running', () => endLeftovers(leftovers, 10_000))
  await clearRuns(directory)

  const parts: Totals[] = []
  if (plan.checks) parts.push(await runChecks())
  const stage = new Stage(lock, directory)
  for (const suite of plan.suites) parts.push(await perform(suite, plan, stage))
  await endRuns(directory)

  const totals = sum(parts)
  console.log(`\n${totalsLine(totals)}`)
  return totals.failed > 0 ? 1 : 0
}

/** A suite whose stage cannot be set counts as one failed, and the others still run. */
async function perform(suite: Suite, plan: Plan, stage: Stage): Promise<Totals> {
  try {
    const env = await stage.setFor(suite)
    return await runSuite(suite, plan.full ? { ...env, LONGPOINT_FULL: '1' } : env, stage.directory)
  } catch (error) {
    const detail = error instanceof Error && 'detail' in error ? `\n${String(error.detail)}` : ''
    console.log(
      `\n  The ${suite} tests could not run. ${error instanceof Error ? error.message : String(error)}${detail}`,
    )
    return oneFailed
  }
}
