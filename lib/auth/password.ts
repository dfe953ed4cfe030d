import 'server-only'
import { hash, verify } from '@node-rs/argon2'

// Argon2id is the package's default kind. OWASP Password Storage: 64 MiB, 3 passes, 1 lane is above its floor.
const cost = { memoryCost: 64 * 1024, timeCost: 3, parallelism: 1 }
const atOnce = 4

let running = 0
const waiting: (() => void)[] = []

/** Each hash holds 64 MiB: more than four at once would be a way to exhaust the machine. */
async function inTurn<Result>(work: () => Promise<Result>): Promise<Result> {
  if (running >= atOnce) await new Promise<void>((resolve) => waiting.push(resolve))
  else running++
  try {
    return await work()
  } finally {
    const next = waiting.shift()
    if (next) next()
    else running--
  }
}

/** The same phrase typed on two keyboards may come as different code points. */
const composed = (password: string) => password.normalize('NFC')

/** What is kept in place of a password. */
export function hashPassword(password: string): Promise<string> {
  return inTurn(() => hash(composed(password), cost))
}

let decoy: Promise<string> | undefined

/** Does the password fit? Without a hash it takes as long and says no, so that the time tells nobody who has an account. */
export async function verifyPassword(kept: string | null, password: string): Promise<boolean> {
  decoy ??= hashPassword('an account that nobody has')
  const against = kept ?? (await decoy)
  const fits = await inTurn(() => verify(against, composed(password)))
  return fits && kept !== null
}
