import { step } from './progress.mjs'
import { mustRun } from './run.mjs'

/** Node's arguments that run a TypeScript file of ours. */
export const typescript = (file: string, ...args: string[]) => ['--import', 'tsx', file, ...args]

/** Run one of our own scripts as a named step. Throws Stop with the end of what it printed. */
export function runScript(name: string, file: string, env: NodeJS.ProcessEnv, ...args: string[]): Promise<string> {
  return step(name, () => mustRun(`${name} did not work out:`, process.execPath, typescript(file, ...args), { env }))
}
