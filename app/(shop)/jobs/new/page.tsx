import type { Metadata } from 'next'
import { NewJobForm } from '@/components/job/new-job-form'
import { NoJobBook } from '@/components/job/no-job-book'
import { Panel } from '@/components/ui/panel'
import { requireActor } from '@/lib/auth/session'

export const metadata: Metadata = { title: 'New job' }

export default async function NewJobPage() {
  const { role } = await requireActor('/jobs/new')
  if (role !== 'journeyman') return <NoJobBook />
  return (
    <>
      <h1>New job</h1>
      <Panel className="max-w-[40rem]">
        <NewJobForm />
      </Panel>
    </>
  )
}
