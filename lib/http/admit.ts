import 'server-only'
import type { Actor } from '@/lib/auth/actor'
import { sessionCookie } from '@/lib/auth/cookies'
import { actorOf } from '@/lib/auth/session'
import { Denied } from '@/lib/errors'
import type { Role } from '@/lib/schemas/account'
import { BadRequest } from './problem'

/** Who may call: named roles, whoever is signed in, or anyone. */
export type Who = readonly Role[] | 'signed-in' | 'anyone'

/** Who sends this request, read from the database at this moment; null without a standing session. */
export function actorFrom(request: Request): Promise<Actor | null> {
  return actorOf(cookieOf(request, sessionCookie()))
}

/** Lets in whom the rule names. @throws BadRequest 401 without a session, Denied when the role is another. */
export async function admit(who: Who, request: Request): Promise<Actor | null> {
  if (who === 'anyone') return null
  const actor = await actorFrom(request)
  if (!actor) throw new BadRequest(401, 'Your sign-in has ended, or there was none.')
  if (who !== 'signed-in' && !who.includes(actor.role)) throw new Denied()
  return actor
}

function cookieOf(request: Request, name: string): string | undefined {
  const pairs = (request.headers.get('cookie') ?? '').split(';').map((pair) => pair.trim())
  return pairs.find((pair) => pair.startsWith(`${name}=`))?.slice(name.length + 1)
}
