import 'server-only'
import { decode } from 'next-auth/jwt'
import { cookies } from 'next/headers'
import { redirect } from 'next/navigation'
import { cache } from 'react'
import { config } from '@/lib/config'
import { Actor } from './actor'
import { sessionCookie } from './cookies'

/**
 * The actor of a session cookie's token. The token says which session only; the rest is read from the database, so
 * that a changed role, a disabled account and a sign-out elsewhere count at once.
 */
export async function actorOf(token: string | undefined): Promise<Actor | null> {
  if (!token) return null
  const claims = await decode({ token, secret: config().AUTH_SECRET }).catch(() => null)
  return claims && Actor.of(claims.signIn, claims.sub)
}

/** For pages: who is signed in, or null. Once a render, however many ask. */
export const currentActor = cache(async (): Promise<Actor | null> => {
  const jar = await cookies()
  return actorOf(jar.get(sessionCookie())?.value)
})

/** For pages: who is signed in; anyone else goes to sign in and comes back to `from`, the page's own path. */
export async function requireActor(from: string): Promise<Actor> {
  return (await currentActor()) ?? redirect(`/sign-in?from=${encodeURIComponent(from)}`)
}
