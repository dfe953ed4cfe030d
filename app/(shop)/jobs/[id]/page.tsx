import type { Metadata } from 'next'
import { JobScreen } from '@/components/job/job-screen'
import { requireActor } from '@/lib/auth/session'
import { getJob } from '@/lib/data/jobs'
import { orNotFound } from '@/lib/http/or-not-found'

export const metadata: Metadata = { title: 'Job' }

export default async function JobPage({ params }: PageProps<'/jobs/[id]'>) {
  const { id } = await params
  return <JobScreen job={await orNotFound(getJob(await requireActor(`/jobs/${id}`), id))} />
}
