import 'server-only'
import type { AuthOptions } from 'next-auth'
import credentials from 'next-auth/providers/credentials'
import { config } from '@/lib/config'
import { endSignIn } from '@/lib/data/sign-ins'
import { log } from '@/lib/log'
import { cookies, isSecure } from './cookies'
import { authorize } from './door'

const thirtyDaysS = 30 * 24 * 3600

/** How next-auth signs people in and out. Its token holds the user's id and the session's id, nothing else. */
export function authOptions(): AuthOptions {
  const { AUTH_SECRET, APP_ORIGIN } = config()
  process.env.NEXTAUTH_URL ??= APP_ORIGIN // next-auth reads its own address from the environment only
  return {
    secret: AUTH_SECRET,
    session: { strategy: 'jwt', maxAge: thirtyDaysS },
    useSecureCookies: isSecure(),
    cookies: cookies(),
    pages: { signIn: '/sign-in', signOut: '/account', error: '/sign-in' },
    providers: [credentials({ credentials: { email: {}, password: {} }, authorize: (given) => authorize(given) })],
    callbacks: {
      jwt: ({ token, user }) =>
        user ? { sub: user.id, signIn: user.signIn } : { sub: token.sub, signIn: token.signIn },
      session: ({ session }) => ({ expires: session.expires }),
    },
    events: {
      signOut: async ({ token }) => {
        if (token?.sub && typeof token.signIn === 'string') await endSignIn(token.signIn, token.sub)
      },
    },
    logger: {
      error: (code) => log.error({ code }, 'sign-in'),
      warn: (code) => log.warn({ code }, 'sign-in'),
      debug: () => undefined,
    },
  }
}
