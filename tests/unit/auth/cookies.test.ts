import { beforeEach, describe, expect, it, vi } from 'vitest'

async function cookiesAt(origin: string) {
  vi.stubEnv('APP_ORIGIN', origin)
  const { cookies } = await import('@/lib/auth/cookies')
  return Object.values(cookies())
}

beforeEach(() => {
  vi.resetModules()
  vi.stubEnv('DATABASE_URL', 'mariadb://a:b@localhost/c')
  vi.stubEnv('AUTH_SECRET', 's'.repeat(32))
})

describe('our cookies', () => {
  it('are bound to the host over https', async () => {
    for (const { name, options } of await cookiesAt('https://longpoint.example')) {
      expect(name).toMatch(/^__Host-longpoint\./)
      // The prefix asks for these three: RFC 6265bis section 4.1.3.2.
      expect(options).toMatchObject({ secure: true, path: '/', httpOnly: true, sameSite: 'lax' })
      expect(options).not.toHaveProperty('domain')
    }
  })

  it('work over plain http on loopback', async () => {
    for (const { name, options } of await cookiesAt('http://localhost:3000')) {
      expect(name).toMatch(/^longpoint\./)
      expect(options).toMatchObject({ secure: false, httpOnly: true, sameSite: 'lax' })
    }
  })
})
