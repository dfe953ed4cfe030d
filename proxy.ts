import { randomBytes } from 'node:crypto'
import { type NextRequest, NextResponse } from 'next/server'
import { config } from '@/lib/config'
import { PageHashes } from '@/lib/http/page-hashes'
import { contentSecurityPolicy, securityHeaders } from '@/lib/http/security-headers'

const hashes = PageHashes.from(process.env.NEXT_DIST_DIR || '.next')

/**
 * Sets the security headers of every answer. A page made at build time is allowed the scripts written into it, by
 * their hashes; a page made on request gets a nonce, which Next reads from the request's own policy header.
 */
export function proxy(request: NextRequest): NextResponse {
  const development = config().NODE_ENV === 'development'
  const made = hashes.of(request.nextUrl.pathname)
  const nonce = made ? undefined : randomBytes(16).toString('base64')
  const scripts = made ? { hashes: made } : { hashes: hashes.fallback(), nonce }
  const policy = contentSecurityPolicy({ ...scripts, development })

  const headers = new Headers(request.headers)
  if (nonce !== undefined) headers.set('content-security-policy', policy)
  const response = NextResponse.next({ request: { headers } })
  response.headers.set('Content-Security-Policy', policy)
  for (const [name, value] of Object.entries(securityHeaders(config().APP_ORIGIN.startsWith('https:'))))
    response.headers.set(name, value)
  return response
}
