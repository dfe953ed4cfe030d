import { spawn } from 'node:child_process'
import { existsSync, readFileSync, rmSync } from 'node:fs'
import path from 'node:path'
import { defer } from '../setup/cleanup.mjs'
import { endGroup } from '../setup/run.mjs'
import type { Suite } from './plan'
import { countSuite } from './totals'
import type { Totals, VitestReport } from './totals'

/** Run one suite with its progress on screen, and count it. */
export async function runSuite(suite: Suite, env: NodeJS.ProcessEnv, directory: string): Promise<Totals> {
  console.log(`\n  ${suite} tests`)
  const file = path.join(directory, `${suite}.json`)
  rmSync(file, { force: true })
  const args = ['run', '--project', suite, '--reporter=default', '--reporter=json', `--outputFile.json=${file}`]
  const code = await watch(['node_modules/vitest/vitest.mjs', ...args], env)
  const report = existsSync(file) ? (JSON.parse(readFileSync(file, 'utf8')) as VitestReport) : undefined
  return countSuite(report, code)
}

function watch(args: readonly string[], env: NodeJS.ProcessEnv): Promise<number> {
  return new Promise((resolve) => {
    const child = spawn(process.execPath, args, { stdio: ['ignore', 'inherit', 'inherit'], detached: true, env })
    const forget = defer(() => endGroup(child))
    const end = (code: number) => void forget().then(() => resolve(code))
    child.once('error', () => end(1))
    child.once('exit', (code) => end(code ?? 1))
  })
}
