import type * as argon2 from '@node-rs/argon2'
import { afterEach, describe, expect, it, vi } from 'vitest'

const real = await vi.importActual<typeof argon2>('@node-rs/argon2')
let running = 0
let most = 0

async function counted<Result>(work: () => Promise<Result>): Promise<Result> {
  most = Math.max(most, ++running)
  try {
    return await work()
  } finally {
    running--
  }
}

vi.mock('@node-rs/argon2', () => ({
  hash: (...given: Parameters<typeof real.hash>) => counted(() => real.hash(...given)),
  verify: (...given: Parameters<typeof real.verify>) => counted(() => real.verify(...given)),
}))
const { hashPassword, verifyPassword } = await import('@/lib/auth/password')

afterEach(() => {
  most = 0
})

describe('a kept password', () => {
  it('is an Argon2id hash of 64 MiB, 3 passes, 1 lane, salted anew', async () => {
    const [one, other] = [await hashPassword('four grey herons'), await hashPassword('four grey herons')]
    expect(one).toMatch(/^\$argon2id\$v=19\$m=65536,t=3,p=1\$/)
    expect(one).not.toBe(other)
  })

  it('fits its own phrase only, however its letters are composed', async () => {
    const kept = await hashPassword('crème brûlée at the café')
    expect(await verifyPassword(kept, 'crème brûlée at the café'.normalize('NFD'))).toBe(true)
    expect(await verifyPassword(kept, 'creme brulee at the cafe')).toBe(false)
    expect(await verifyPassword(kept, '')).toBe(false)
  })
})

describe('an account that there is not', () => {
  it('is looked at as long as one that there is', async () => {
    await verifyPassword(null, 'first')
    most = 0
    expect(await verifyPassword(null, 'an account that nobody has')).toBe(false)
    expect(most).toBe(1)
  })
})

describe('hashing', () => {
  it('runs at most four at once', async () => {
    await Promise.all(Array.from({ length: 12 }, (_, n) => hashPassword(`phrase ${n}`)))
    expect(most).toBe(4)
    expect(running).toBe(0)
  })

  it('goes on after one that broke', async () => {
    const broken = Array.from({ length: 5 }, () => verifyPassword('not a hash', 'x').catch(() => 'broken'))
    expect(await Promise.all(broken)).toEqual(Array(5).fill('broken'))
    expect(await hashPassword('still here')).toContain('$argon2id$')
  })
})
