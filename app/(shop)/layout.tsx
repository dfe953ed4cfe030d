import type { ReactNode } from 'react'
import { QueryProvider } from '@/components/job/query-provider'

export default function ShopLayout({ children }: { children: ReactNode }) {
  return <QueryProvider>{children}</QueryProvider>
}
