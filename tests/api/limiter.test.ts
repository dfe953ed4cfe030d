import '@/tests/support/database'
import { afterEach, expect, it, vi } from 'vitest'
import { limiterOf } from '@/lib/data/limiter'

afterEach(() => {
  vi.useRealTimers()
})

it('counts without setting anything going: what has run out is swept by the hourly tidying alone', async () => {
  const limit = { name: 'test-sweep', points: 2, seconds: 60 }
  await limiterOf(limit).consume('somebody')
  vi.useFakeTimers()
  limiterOf(limit)
  expect(vi.getTimerCount()).toBe(0)
  vi.useRealTimers()
  await limiterOf(limit).consume('somebody')
  await expect(limiterOf(limit).consume('somebody')).rejects.toMatchObject({ remainingPoints: 0 })
})
