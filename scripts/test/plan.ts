import { Stop } from '../setup/stop.mjs'

/** In the order they run: what is quick to tell comes first. */
const suites = ['unit', 'proof', 'api', 'browser', 'faults'] as const
export type Suite = (typeof suites)[number]

export interface Plan {
  checks: boolean
  suites: readonly Suite[]
  /** The large doses: hundreds of kills instead of ten. */
  full: boolean
}

/** Read `--only unit,proof,checks` and `--full`. Throws Stop with what there is to choose from. */
export function readPlan(flags: readonly string[]): Plan {
  const plan: Plan = { checks: true, suites, full: false }
  for (let at = 0; at < flags.length; at++) {
    if (flags[at] === '--full') plan.full = true
    else if (flags[at] === '--only') Object.assign(plan, readNames(flags[++at]))
    else throw new Stop(`There is no option ${flags[at]}. There are: --full, --only <names>.`)
  }
  return plan
}

function readNames(text = ''): Pick<Plan, 'checks' | 'suites'> {
  const names = text.split(',')
  const known: readonly string[] = ['checks', ...suites]
  const unknown = names.find((name) => !known.includes(name))
  if (unknown !== undefined)
    throw new Stop(`--only knows ${known.join(', ')}, separated by commas; it does not know '${unknown}'.`)
  return { checks: names.includes('checks'), suites: suites.filter((suite) => names.includes(suite)) }
}
