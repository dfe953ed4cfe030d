/** Where scripts of one page may come from. */
interface Scripts {
  /** Hashes of the inline scripts written into the page at build time, as `sha256-…`. */
  hashes: readonly string[]
  /** Chance of this one answer, for pages written at request time. */
  nonce?: string
  /** Next's development server evaluates code and talks to itself over a socket. */
  development: boolean
}

/** The content security policy of one page. Styles may stand inline: formulas and popovers place themselves by them. */
export function contentSecurityPolicy({ hashes, nonce, development }: Scripts): string {
  const sources = [...hashes, ...(nonce === undefined ? [] : [`nonce-${nonce}`])].map((source) => `'${source}'`)
  const scripts = development ? ["'unsafe-inline'", "'unsafe-eval'"] : sources
  const directives: { [name: string]: string[] } = {
    'default-src': ["'self'"],
    'script-src': ["'self'", ...scripts],
    'style-src': ["'self'", "'unsafe-inline'"],
    'img-src': ["'self'", 'blob:', 'data:'],
    'connect-src': ["'self'", ...(development ? ['ws:'] : [])],
    'object-src': ["'none'"],
    'base-uri': ["'none'"],
    'form-action': ["'self'"],
    'frame-ancestors': ["'none'"],
  }
  return Object.entries(directives)
    .map(([name, values]) => [name, ...values].join(' '))
    .join('; ')
}

/** What every answer carries beside its policy. HSTS only where the address is https: on loopback it would lock us out. */
export function securityHeaders(https: boolean): { [name: string]: string } {
  return {
    'Cross-Origin-Opener-Policy': 'same-origin',
    'Cross-Origin-Resource-Policy': 'same-origin',
    'X-Content-Type-Options': 'nosniff',
    'X-Frame-Options': 'DENY',
    'Referrer-Policy': 'strict-origin-when-cross-origin',
    'Permissions-Policy': 'camera=(), microphone=(), geolocation=(), payment=(), usb=(), browsing-topics=()',
    ...(https ? { 'Strict-Transport-Security': 'max-age=63072000; includeSubDomains' } : {}),
  }
}
