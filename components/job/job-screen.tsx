'use client'

import { useQuery } from '@tanstack/react-query'
import Link from 'next/link'
import { useState } from 'react'
import { Button, ButtonLink } from '@/components/ui/button'
import { EmptyState } from '@/components/ui/states'
import { jobQuery } from '@/lib/queries/jobs'
import type { JobView, SheetLine } from '@/lib/schemas/views'
import { ArchiveButton } from './archive-button'
import { dayInWords } from './day'
import { JobEdit } from './job-edit'

/** One job: what it says of itself, and its cut sheets. */
export function JobScreen({ job: first }: { job: JobView }) {
  const { data: job } = useQuery({ ...jobQuery(first.id), initialData: first })
  const [editing, setEditing] = useState(false)
  return (
    <>
      <p className="crumb">
        <Link href="/jobs" prefetch={false}>
          Job book
        </Link>
        {job.archivedAt && ` · put away ${dayInWords(job.archivedAt)}`}
      </p>
      <h1>{job.name}</h1>
      {editing ? (
        <JobEdit job={job} onDone={() => setEditing(false)} />
      ) : (
        <>
          <p className="lede">{[job.place, job.client && `for ${job.client}`].filter(Boolean).join(' · ')}</p>
          {job.notes && <p className="mb-5 max-w-[62ch] whitespace-pre-line">{job.notes}</p>}
          {job.writable && (
            <div className="mb-8 flex flex-wrap gap-3">
              <ButtonLink href={`/handbook/handrail?job=${job.id}`} prefetch={false} variant="primary">
                Measure a rail for it
              </ButtonLink>
              <Button onClick={() => setEditing(true)}>Change the job</Button>
              <ArchiveButton job={job} />
            </div>
          )}
        </>
      )}
      <h2 className="mb-3">Cut sheets</h2>
      {job.sheets.length === 0 && (
        <EmptyState title="No cut sheet yet">Measure a rail, then save its cut sheet to this job.</EmptyState>
      )}
      <ul className="grid gap-3">
        {job.sheets.map((line) => (
          <SheetRow key={line.sheet} jobId={job.id} line={line} />
        ))}
      </ul>
    </>
  )
}

function SheetRow({ jobId, line }: { jobId: string; line: SheetLine }) {
  return (
    <li>
      <Link
        href={`/jobs/${jobId}/sheets/${line.sheet}`}
        prefetch={false}
        className="grid gap-1 rounded-plate border border-rule bg-card p-5 text-ink no-underline hover:border-ink max-sm:p-4"
      >
        <b className="font-head text-[22px]">{line.name}</b>
        <span>
          sheet {line.sheet}, revision {line.revision}
        </span>
        <span className="text-mute">
          measured by {line.measuredBy}, {dayInWords(line.measuredOn)}
        </span>
      </Link>
    </li>
  )
}
