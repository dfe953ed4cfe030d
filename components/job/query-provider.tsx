'use client'

import { QueryClient, QueryClientProvider } from '@tanstack/react-query'
import { useState, type ReactNode } from 'react'

const makeClient = () => new QueryClient({ defaultOptions: { queries: { staleTime: 15_000, retry: 1 } } })

/** One store of fetched lists for the signed-in screens. */
export function QueryProvider({ children }: { children: ReactNode }) {
  const [client] = useState(makeClient)
  return <QueryClientProvider client={client}>{children}</QueryClientProvider>
}
