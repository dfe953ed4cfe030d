import type { Instrumentation } from 'next'

const hourMs = 3600_000

/** Before the first request: settings are checked, addresses stamped, and old answers and counters cleared by the hour. */
export async function register(): Promise<void> {
  if (process.env.NEXT_RUNTIME !== 'nodejs') return
  const { config } = await import('@/lib/config')
  const { stampAddresses } = await import('@/lib/http/client-address')
  const { tidy } = await import('@/lib/data/tidy')
  const { log } = await import('@/lib/log')
  config()
  stampAddresses()
  setInterval(() => void tidy().catch((err: unknown) => log.warn({ err }, 'tidy')), hourMs).unref()
}

/** What a page or route threw past its own handling. */
export const onRequestError: Instrumentation.onRequestError = async (err, { path, method }, { routePath }) => {
  if (process.env.NEXT_RUNTIME !== 'nodejs') return
  const { log } = await import('@/lib/log')
  log.error({ err, method, path: path.split('?')[0], routePath }, 'request failed')
}
