import { queryOptions } from '@tanstack/react-query'
import type { Me } from '@/lib/schemas/views'
import { send } from './send'

/** Who is signed in on this device, or null. */
export const meQuery = queryOptions({
  queryKey: ['me'],
  queryFn: ({ signal }) => send<Me | null>('GET', '/api/me', { signal }),
  staleTime: 60_000,
})
