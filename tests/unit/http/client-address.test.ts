import { createServer, get, type IncomingHttpHeaders, type Server } from 'node:http'
import type { AddressInfo } from 'node:net'
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest'

const header = 'x-longpoint-address'
let server: Server
let seen: IncomingHttpHeaders = {}

beforeAll(async () => {
  server = createServer((request, response) => {
    seen = request.headers
    response.end()
  })
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve))
})
afterAll(() => server.close())

async function behind(proxies: number) {
  vi.resetModules()
  vi.stubEnv('DATABASE_URL', 'mariadb://a:b@localhost/c')
  vi.stubEnv('APP_ORIGIN', 'http://localhost:3000')
  vi.stubEnv('AUTH_SECRET', 's'.repeat(32))
  vi.stubEnv('TRUSTED_PROXY', String(proxies))
  const { stampAddresses } = await import('@/lib/http/client-address')
  stampAddresses()
}

async function addressFor(headers: { [name: string]: string }) {
  const { port } = server.address() as AddressInfo
  await new Promise<void>((resolve) =>
    get({ host: '127.0.0.1', port, headers }, (response) => response.resume().on('end', resolve)),
  )
  return seen[header]
}

describe('where a request comes from', () => {
  it('is the socket’s own end, whatever the caller writes', async () => {
    await behind(0)
    expect(await addressFor({})).toBe('127.0.0.1')
    expect(await addressFor({ [header]: '6.6.6.6', 'X-Forwarded-For': '6.6.6.6', Forwarded: 'for=6.6.6.6' })).toBe(
      '127.0.0.1',
    )
  })

  it('behind a proxy of ours is what that proxy saw, not what its caller wrote', async () => {
    await behind(1)
    expect(await addressFor({ 'X-Forwarded-For': '6.6.6.6, 203.0.113.9' })).toBe('203.0.113.9')
    expect(await addressFor({})).toBe('127.0.0.1')
  })

  it('behind two is what the outer one saw', async () => {
    await behind(2)
    expect(await addressFor({ 'X-Forwarded-For': '6.6.6.6, 203.0.113.9, 10.0.0.1' })).toBe('203.0.113.9')
  })

  it('is a whole /64 of IPv6, and the plain address when it is mapped', async () => {
    await behind(1)
    const asked = async (address: string) => addressFor({ 'X-Forwarded-For': address })
    expect(await asked('2001:db8:1:2:3:4:5:6')).toBe('2001:db8:1:2::/64')
    expect(await asked('2001:db8:1:2::9')).toBe('2001:db8:1:2::/64')
    expect(await asked('2001:db8::1')).toBe('2001:db8:0:0::/64')
    expect(await asked('::1')).toBe('0:0:0:0::/64')
    expect(await asked('::ffff:203.0.113.7')).toBe('203.0.113.7')
    expect(await asked('not an address')).toBe('not an address')
  })
})
