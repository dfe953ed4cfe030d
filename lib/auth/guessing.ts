import 'server-only'
import { createHash } from 'node:crypto'
import { RateLimiterRes } from 'rate-limiter-flexible'
import { limiterOf, type Limit } from '@/lib/data/limiter'
import { TooMany } from '@/lib/errors'

const perAccount: Limit = { name: 'sign-in-account', points: 10, seconds: 900 }
const perAddress: Limit = { name: 'sign-in-address', points: 50, seconds: 900 }

/** Keys are hashed: an e-mail may be longer than the column, and the table need not name anybody. */
const keyOf = (text: string) => createHash('sha256').update(text).digest('base64url')

/** Counts one try for `key`. @throws TooMany */
export async function countTry(limit: Limit, key: string): Promise<void> {
  try {
    await limiterOf(limit).consume(keyOf(key))
  } catch (refused) {
    if (refused instanceof RateLimiterRes) throw new TooMany(Math.max(1, Math.ceil(refused.msBeforeNext / 1000)))
    throw refused
  }
}

/** Counts a guess at this account from this address, before the password is looked at. @throws TooMany */
export async function countGuess(email: string, address: string): Promise<void> {
  await countTry(perAddress, address)
  await countTry(perAccount, email)
}

/** The guess was right: it was none. */
export async function forgiveGuess(email: string, address: string): Promise<void> {
  await limiterOf(perAccount).delete(keyOf(email))
  await limiterOf(perAddress).reward(keyOf(address))
}
