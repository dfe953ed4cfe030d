import { accessSync, constants } from 'node:fs'
import path from 'node:path'
import { step } from './progress.mjs'
import { mustRun, run } from './run.mjs'
import { Stop } from './stop.mjs'

/** Programs that ordinary accounts do not have on their path lie in the sbin directories. */
const searched = [...(process.env.PATH ?? '').split(path.delimiter), '/usr/local/sbin', '/usr/sbin', '/usr/bin']

/**
 * Debian's server without its system service: Longpoint runs a private one, and starts nothing else. Making an empty
 * database takes a program of the client's package.
 */
export const mariadb = {
  what: 'MariaDB',
  programs: ['mariadbd', 'mariadb-install-db', 'my_print_defaults'],
  packages: ['mariadb-server-core', 'mariadb-client-core'],
}
export const chromium = { what: 'Chromium', programs: ['chromium'], packages: ['chromium'] }

type Wanted = typeof mariadb

/** The full path of a program, or undefined when this machine has none. */
function find(program: string): string | undefined {
  return searched
    .filter(Boolean)
    .map((directory) => path.join(directory, program))
    .find(isExecutable)
}

/** Have a program and those it needs, installed with apt-get when missing. Throws Stop with the command to run by hand. */
export async function ensure(wanted: Wanted): Promise<void> {
  const missing = () => wanted.programs.filter((program) => !find(program))
  if (missing().length === 0) return
  await install(wanted)
  if (missing().length === 0) return
  throw new Stop(`${wanted.what} was installed, but not where Debian puts it: ${missing().join(', ')}.`)
}

/** The full path of a program that `ensure` found. */
export function programPath(program: string): string {
  return find(program) ?? program
}

async function install({ packages, what }: Wanted) {
  const byHand = `sudo apt-get update && sudo apt-get install --no-install-recommends ${packages.join(' ')}`
  if (!find('apt-get'))
    throw new Stop(`${what} is not installed, and this machine has no apt-get. Install ${what}, then run this again.`)
  const asRoot = await rootPrefix()
  if (!asRoot)
    throw new Stop(
      `${what} is not installed, and this account may not install it. Run this, then try again:\n  ${byHand}`,
    )
  const aptGet = (...args: string[]): [string, string[]] => {
    const [command = '', ...rest] = [
      ...asRoot,
      'env',
      'DEBIAN_FRONTEND=noninteractive',
      'apt-get',
      '-o',
      'DPkg::Lock::Timeout=120',
      ...args,
    ]
    return [command, rest]
  }
  const sentence = `apt-get could not install ${what}. Check the network, or run this by hand:\n  ${byHand}`
  await step(`Installing ${what} from Debian (${packages.join(', ')})`, async () => {
    await mustRun(sentence, ...aptGet('update'))
    await mustRun(sentence, ...aptGet('install', '-y', '--no-install-recommends', ...packages))
  })
}

/** How to become root without a question: nothing for root itself, sudo where it needs no password. */
async function rootPrefix(): Promise<string[] | undefined> {
  if (process.getuid?.() === 0) return []
  const { code } = await run('sudo', ['-n', 'true'])
  return code === 0 ? ['sudo', '-n'] : undefined
}

function isExecutable(file: string) {
  try {
    accessSync(file, constants.X_OK)
    return true
  } catch {
    return false
  }
}
