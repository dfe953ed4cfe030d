import { isFreeForBrowsers, nextFree } from '../setup/ports'
import { Stop } from '../setup/stop.mjs'
import { onPort } from './options'
import type { Options } from './options'

/** The options with a port nobody uses. Throws Stop that names the next free one, or takes it with --any-port. */
export async function claimPort(options: Options): Promise<Options> {
  if (await isFreeForBrowsers(options.host, options.port)) return options
  const other = await nextFree(options.host, options.port + 1)
  if (other === undefined)
    throw new Stop(`Port ${options.port} is in use, and so are the hundred after it. Choose one with PORT.`)
  if (options.anyPort) {
    process.stdout.write(`  Port ${options.port} is in use by another program: taking ${other}.\n`)
    return onPort(options, other)
  }
  const command = options.dev ? 'npm run dev' : 'npm start'
  throw new Stop(
    `Port ${options.port} is in use by another program. Port ${other} is free:\n\n  PORT=${other} ${command}\n\n(or: ${command} -- --any-port)`,
  )
}
