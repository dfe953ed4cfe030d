import { availableParallelism } from 'node:os'
import { defineConfig } from 'vitest/config'

const alias = { '@': import.meta.dirname, 'server-only': `${import.meta.dirname}/tests/support/server-only.ts` }

/** Pure suites run in parallel; suites that share a server or a database run one file at a time. */
function project(
  name: string,
  options: { environment?: 'node' | 'jsdom'; serial?: boolean; testTimeout?: number } = {},
) {
  return {
    resolve: { alias },
    test: {
      name,
      include: [`tests/${name}/**/*.test.{ts,tsx}`],
      environment: options.environment ?? ('node' as const),
      fileParallelism: !options.serial,
      testTimeout: options.testTimeout ?? 10_000,
      hookTimeout: 120_000,
      // Pages are looked at two at once, as a small machine has cores.
      maxConcurrency: 2,
      // A busy machine may be slow; what never comes still fails.
      expect: { poll: { timeout: 10_000 } },
    },
  }
}

export default defineConfig({
  test: {
    // Left to itself it keeps a core free, which on a machine of two halves the speed.
    maxWorkers: availableParallelism(),
    projects: [
      project('unit'),
      project('proof'),
      project('api', { serial: true, testTimeout: 20_000 }),
      // Run alone each file starts and builds the app itself; under `npm test` all come to the one that stands.
      project('browser', { serial: !process.env.TEST_APP_URL, testTimeout: 120_000 }),
      project('faults', { serial: true, testTimeout: 300_000 }),
    ],
  },
})
