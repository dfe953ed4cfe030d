import type { CookiesOptions } from 'next-auth'
import { config } from '@/lib/config'

/** Over https the `__Host-` prefix binds a cookie to this host, this path and https; plain http on loopback has none. */
export const isSecure = () => config().APP_ORIGIN.startsWith('https:')

const named = (name: string) => `${isSecure() ? '__Host-' : ''}longpoint.${name}`

/** The name of the cookie that holds the session. */
export const sessionCookie = () => named('session')

/** How all of our cookies are named and kept. */
export function cookies(): Partial<CookiesOptions> {
  const options = { httpOnly: true, sameSite: 'lax', path: '/', secure: isSecure() } as const
  return {
    sessionToken: { name: sessionCookie(), options },
    csrfToken: { name: named('csrf'), options },
    callbackUrl: { name: named('return'), options },
  }
}
