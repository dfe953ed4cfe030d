import { isLoopback } from '../setup/ports'
import { Stop } from '../setup/stop.mjs'

export interface Options {
  dev: boolean
  anyPort: boolean
  host: string
  port: number
  /** The address people type. Sign-in and the origin check go by it. */
  origin: string
  /** A server of the user's: then no database is started. */
  databaseUrl: string | undefined
}

const flagsKnown = ['--dev', '--any-port']

/** What was asked for on the command line and in the environment. Throws Stop with the name of what is wrong. */
export function readOptions(flags: readonly string[], env: NodeJS.ProcessEnv): Options {
  const unknown = flags.find((flag) => !flagsKnown.includes(flag))
  if (unknown) throw new Stop(`There is no option ${unknown}. There are: ${flagsKnown.join(', ')}.`)
  const host = env.HOST || '127.0.0.1'
  const port = readPort(env.PORT)
  if (!isLoopback(host)) refuseOpenDoor(env)
  return {
    dev: flags.includes('--dev'),
    anyPort: flags.includes('--any-port'),
    host,
    port,
    origin: env.APP_ORIGIN || `http://localhost:${port}`,
    databaseUrl: env.DATABASE_URL || undefined,
  }
}

/** The same on another port. */
export function onPort(options: Options, port: number): Options {
  const origin = options.origin === `http://localhost:${options.port}` ? `http://localhost:${port}` : options.origin
  return { ...options, port, origin }
}

function readPort(text: string | undefined): number {
  const port = text ? Number(text) : 3000
  if (Number.isInteger(port) && port > 0 && port <= 65_535) return port
  throw new Stop(`PORT is ${text}, which is no port: give a whole number from 1 to 65535.`)
}

/** Beyond this machine, letters must arrive and the address must be the one people type. */
function refuseOpenDoor(env: NodeJS.ProcessEnv) {
  const sentence = `HOST is ${env.HOST}, which lets other machines in.`
  if (!env.SMTP_URL)
    throw new Stop(
      `${sentence} Set SMTP_URL first, so that invitations and password letters reach people; or leave HOST out.`,
    )
  if (!env.APP_ORIGIN)
    throw new Stop(
      `${sentence} Set APP_ORIGIN to the address people type, such as https://longpoint.example; or leave HOST out.`,
    )
}
