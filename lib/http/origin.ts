import { config } from '@/lib/config'
import { BadRequest } from './problem'

const loopbackNames = ['localhost', '127.0.0.1', '[::1]']

/** On loopback one machine has three names; anywhere else only the address people type counts. */
function isOurs(origin: string): boolean {
  const own = config().APP_ORIGIN
  if (origin === own) return true
  const { hostname, port, protocol } = new URL(own)
  if (!loopbackNames.includes(hostname)) return false
  const suffix = port === '' ? '' : `:${port}`
  return loopbackNames.some((name) => origin === `${protocol}//${name}${suffix}`)
}

/**
 * A page of another site must not act in a reader's name: whatever changes something says that it comes from ours.
 * @throws BadRequest 403
 */
export function requireOwnOrigin(request: Request): void {
  const origin = request.headers.get('origin')
  if (origin === null || !isOurs(origin))
    throw new BadRequest(403, 'This request does not come from a page of Longpoint.')
}
