import { describe, expect, it } from 'vitest'
import { uuidv7 } from '@/models/uuid'

describe('uuidv7', () => {
  it('carries the milliseconds of RFC 9562, appendix A.6', () => {
    expect(uuidv7(0x017f22e279b0)).toMatch(/^017f22e2-79b0-7[0-9a-f]{3}-[89ab][0-9a-f]{3}-[0-9a-f]{12}$/)
  })

  it('sorts by the time it was made', () => {
    const ids = [1, 255, 256, 1_700_000_000_000, 1_700_000_000_001].map((at) => uuidv7(at))
    expect([...ids].sort()).toEqual(ids)
  })

  it('never comes twice', () => {
    expect(new Set(Array.from({ length: 10_000 }, () => uuidv7(5))).size).toBe(10_000)
  })
})
