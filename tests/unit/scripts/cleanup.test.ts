import { spawnSync } from 'node:child_process'
import path from 'node:path'
import { expect, it } from 'vitest'

const cleanup = path.resolve('scripts/setup/cleanup.mjs')

/** A command that has something to undo, and then meets an accident. */
const ends = (accident: string) =>
  spawnSync(
    process.execPath,
    [
      '--input-type=module',
      '--eval',
      `import { defer, unwindOnSignals } from ${JSON.stringify(cleanup)}
       unwindOnSignals()
       defer(async () => console.log('undone'))
       setInterval(() => {}, 1000)
       ${accident}`,
    ],
    { encoding: 'utf8', timeout: 10_000 },
  )

it.each([
  ['what nobody caught', `setTimeout(() => { throw new Error('the saw jammed') })`],
  ['a promise that nobody awaited', `Promise.reject(new Error('the saw jammed'))`],
])('undoes what it began when it is ended by %s', (_name, accident) => {
  const { status, stdout, stderr } = ends(accident)
  expect([status, stdout.trim()]).toEqual([1, 'undone'])
  expect(stderr).toContain('the saw jammed')
})

it('undoes what it began on SIGTERM, and leaves with the code a shell expects', () => {
  const { status, stdout } = ends(`process.kill(process.pid, 'SIGTERM')`)
  expect(status).toBe(143)
  expect(stdout).toContain('undone')
})
