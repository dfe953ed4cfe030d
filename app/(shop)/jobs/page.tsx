import { dehydrate, HydrationBoundary, QueryClient } from '@tanstack/react-query'
import type { Metadata } from 'next'
import { JobList } from '@/components/job/job-list'
import { NoJobBook } from '@/components/job/no-job-book'
import { requireActor } from '@/lib/auth/session'
import { listJobs } from '@/lib/data/jobs'
import { jobsQuery } from '@/lib/queries/jobs'

export const metadata: Metadata = { title: 'Job book' }

export default async function JobsPage() {
  const actor = await requireActor('/jobs')
  if (actor.role !== 'journeyman' && actor.role !== 'coordinator') return <NoJobBook />
  const client = new QueryClient()
  await client.prefetchInfiniteQuery({
    ...jobsQuery(),
    queryFn: () => listJobs(actor, { archived: 'no' }),
  })
  return (
    <HydrationBoundary state={dehydrate(client)}>
      <JobList writable={actor.role === 'journeyman'} />
    </HydrationBoundary>
  )
}
