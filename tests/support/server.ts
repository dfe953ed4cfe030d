import { Longpoint, newRun, removeRun } from './longpoint'

export interface ServedApp {
  url: string
  stop: () => Promise<void>
}

/**
 * The production app with the demo shop: the one `npm test` started, or, when a browser test is run alone, one of its
 * own that builds first where the build is stale.
 */
export async function servedApp(): Promise<ServedApp> {
  const given = process.env.TEST_APP_URL
  if (given) return { url: given, stop: () => Promise.resolve() }
  const directory = newRun()
  const longpoint = await Longpoint.launch({ directory, env: { NEXT_DIST_DIR: '.data/test-build' } })
  const url = await longpoint.address()
  return {
    url,
    stop: async () => {
      await longpoint.end('SIGTERM')
      await removeRun(directory)
    },
  }
}
