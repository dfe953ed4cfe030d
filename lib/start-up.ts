import { config, ConfigError } from './config'
import { stampAddresses } from './http/client-address'
import { log } from './log'

const hourMs = 3600_000

/** Before the first request: settings are checked, callers' addresses stamped, old answers and counters cleared by the hour. */
export async function startUp(): Promise<void> {
  try {
    config()
  } catch (error) {
    if (!(error instanceof ConfigError)) throw error
    process.stderr.write(`${error.message}\n`)
    process.exit(1) // the framework itself would go on and answer every request with a fault
  }
  stampAddresses()
  const { tidy } = await import('./data/tidy') // connects, so it comes after the settings
  setInterval(() => void tidy().catch((err: unknown) => log.warn({ err }, 'tidy')), hourMs).unref()
}
