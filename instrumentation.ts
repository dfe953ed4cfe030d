import type { Instrumentation } from 'next'

/** Once, before the first request. */
export async function register(): Promise<void> {
  if (process.env.NEXT_RUNTIME !== 'nodejs') return
  const { startUp } = await import('@/lib/start-up')
  await startUp()
}

/** What a page or route threw past its own handling. */
export const onRequestError: Instrumentation.onRequestError = async (err, { path, method }, { routePath }) => {
  if (process.env.NEXT_RUNTIME !== 'nodejs') return
  const { log } = await import('@/lib/log')
  log.error({ err, method, path: path.split('?')[0], routePath }, 'request failed')
}
