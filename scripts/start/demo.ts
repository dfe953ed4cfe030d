import * as mariadbClient from 'mariadb'
import { demoPeople } from '../seed/people'
import { isLoopback } from '../setup/ports'
import { runScript } from '../setup/script'
import { Stop } from '../setup/stop.mjs'

export interface SignIn {
  email: string
  password: string
  role: string
}

/**
 * The demo shop, seeded once, where only this machine can reach it. Beyond that, demo sign-ins printed in the README
 * would be open doors: throws Stop while there are any.
 */
export async function seedDemo(host: string, env: NodeJS.ProcessEnv): Promise<readonly SignIn[]> {
  if (isLoopback(host)) {
    await runScript('Seeding the demo shop', 'scripts/seed.ts', env)
    return demoPeople
  }
  if (await hasDemoPeople(env.DATABASE_URL ?? ''))
    throw new Stop(
      'HOST lets other machines in, but this database has the demo sign-ins, whose passwords are printed in the README. Use a database of its own (LONGPOINT_DATA_DIR or DATABASE_URL), or leave HOST out.',
    )
  return []
}

async function hasDemoPeople(url: string): Promise<boolean> {
  const connection = await mariadbClient.createConnection(url)
  try {
    const rows: unknown[] = await connection.query('SELECT 1 FROM users WHERE demo LIMIT 1')
    return rows.length > 0
  } finally {
    await connection.end()
  }
}
