import { subscribe } from 'node:diagnostics_channel'
import type { IncomingMessage } from 'node:http'
import { isIPv6 } from 'node:net'
import { config } from '@/lib/config'

const header = 'x-longpoint-address'

/**
 * Writes on every request where it came from, before anything reads it. What the caller wrote there itself is
 * overwritten: the framework would pass a forged X-Forwarded-For on, and guessing is counted by address.
 */
export function stampAddresses(): void {
  subscribe('http.server.request.start', (message) => {
    const { request } = message as { request: IncomingMessage }
    request.headers[header] = network(callerOf(request))
  })
}

/** Behind n proxies of ours, the n-th address from the right is the one that the outermost of them saw. */
function callerOf(request: IncomingMessage): string {
  const direct = request.socket.remoteAddress ?? 'unknown'
  const proxies = config().TRUSTED_PROXY
  if (proxies === 0) return direct
  const chain = String(request.headers['x-forwarded-for'] ?? '')
    .split(',')
    .map((part) => part.trim())
  return chain.at(-proxies) || direct
}

/** One subscriber holds a whole /64 of IPv6, so it counts as one. */
function network(address: string): string {
  const plain = address.replace(/^::ffff:(?=\d+\.)/, '')
  if (!isIPv6(plain)) return plain
  const groups = new URL(`http://[${plain.replace(/%.*$/, '')}]`).hostname.slice(1, -1).split('::')
  const head = (groups[0] ?? '').split(':').filter(Boolean)
  const tail = (groups[1] ?? '').split(':').filter(Boolean)
  const whole =
    groups.length === 2 ? [...head, ...Array<string>(8 - head.length - tail.length).fill('0'), ...tail] : head
  return `${whole.slice(0, 4).join(':')}::/64`
}

/** Where a request came from, as stamped. */
export function addressOf(request: Request): string {
  return request.headers.get(header) ?? 'unknown'
}
