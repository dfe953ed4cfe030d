import { readFileSync } from 'node:fs'
import { npm } from '../setup/npm.mjs'
import { step } from '../setup/progress.mjs'
import { run } from '../setup/run.mjs'
import { none, oneFailed, onePassed, sum } from './totals'
import type { Totals } from './totals'

/** Scripts of package.json, so that each can be run alone by its name. The slow ones first, two at a time. */
const scripts = ['lint', 'types', 'format:check', 'boundaries', 'knip']
const atOnce = 2

interface Outcome {
  name: string
  passed: boolean
  output: string
  seconds: number
}

/** Run every check, say which failed and what it printed, and count each as one. */
export async function runChecks(): Promise<Totals> {
  const outcomes = await step(`Checking ${[...scripts, 'pins'].join(', ')}`, () => runAll([...scripts]))
  outcomes.push(checkPins())
  for (const { name, passed, output, seconds } of outcomes) {
    console.log(`  ${passed ? '✓' : '✗'} ${name} (${seconds} s)`)
    if (!passed) console.log(output.trimEnd().replaceAll(/^/gm, '      '))
  }
  return sum([none, ...outcomes.map(({ passed }) => (passed ? onePassed : oneFailed))])
}

async function runAll(waiting: string[]): Promise<Outcome[]> {
  const outcomes: Outcome[] = []
  const work = async () => {
    for (let name = waiting.shift(); name; name = waiting.shift()) outcomes.push(await runOne(name))
  }
  await Promise.all(Array.from({ length: atOnce }, work))
  return outcomes
}

async function runOne(name: string): Promise<Outcome> {
  const began = Date.now()
  const { code, output } = await run(...npm('run', '--silent', name))
  return { name, passed: code === 0, output, seconds: Math.round((Date.now() - began) / 1000) }
}

/** Every package is pinned to one version: what was tested is what is installed. */
function checkPins(): Outcome {
  const { dependencies, devDependencies } = JSON.parse(readFileSync('package.json', 'utf8')) as Record<
    string,
    Record<string, string>
  >
  const loose = Object.entries({ ...dependencies, ...devDependencies }).filter(
    ([, version]) => !/^\d+\.\d+\.\d+/.test(version),
  )
  const output = loose.map(([name, version]) => `${name} is not pinned: ${version}`).join('\n')
  return { name: 'pins', passed: loose.length === 0, output, seconds: 0 }
}
