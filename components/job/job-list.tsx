'use client'

import { useInfiniteQuery } from '@tanstack/react-query'
import Link from 'next/link'
import { useState } from 'react'
import { Button, ButtonLink } from '@/components/ui/button'
import { ChoiceField } from '@/components/ui/choice-field'
import { EmptyState, LoadingState, ProblemState } from '@/components/ui/states'
import { TextField } from '@/components/ui/text-field'
import { jobsQuery } from '@/lib/queries/jobs'
import { sentenceOf } from '@/lib/queries/sentence'
import type { JobLine } from '@/lib/schemas/views'
import { dayInWords } from './day'

const shelves = [
  { value: 'no', name: 'In hand' },
  { value: 'yes', name: 'Put away' },
] as const

const holds = ({ name, place, client }: JobLine, words: string) =>
  `${name} ${place} ${client}`.toLowerCase().includes(words.trim().toLowerCase())

/** The job book: jobs in hand or put away, last changed first. */
export function JobList({ writable }: { writable: boolean }) {
  const [archived, setArchived] = useState<'yes' | 'no'>('no')
  const [words, setWords] = useState('')
  const jobs = useInfiniteQuery(jobsQuery(archived))
  const lines = jobs.data?.pages.flatMap((page) => page.lines) ?? []
  const shown = lines.filter((line) => holds(line, words))
  return (
    <>
      <div className="flex flex-wrap items-end justify-between gap-4">
        <h1>Job book</h1>
        {writable && (
          <ButtonLink href="/jobs/new" prefetch={false} variant="primary">
            New job
          </ButtonLink>
        )}
      </div>
      <div className="my-5 grid gap-4 sm:grid-cols-[minmax(0,24rem)_auto]">
        <TextField label="Find a job" type="search" value={words} onChange={(event) => setWords(event.target.value)} />
        <ChoiceField label="Shelf" options={shelves} value={archived} onChange={setArchived} />
      </div>
      {jobs.isPending && <LoadingState title="Opening the job book…" />}
      {jobs.isError && (
        <ProblemState
          title="The job book did not open"
          action={<Button onClick={() => jobs.refetch()}>Try again</Button>}
        >
          {sentenceOf(jobs.error)}
        </ProblemState>
      )}
      {jobs.isSuccess && lines.length === 0 && <NoJobs archived={archived} writable={writable} />}
      {lines.length > 0 && shown.length === 0 && <p>No job here holds “{words.trim()}”.</p>}
      <ul className="grid gap-3">
        {shown.map((line) => (
          <JobRow key={line.id} line={line} />
        ))}
      </ul>
      {jobs.hasNextPage && (
        <Button className="mt-5" disabled={jobs.isFetchingNextPage} onClick={() => jobs.fetchNextPage()}>
          {jobs.isFetchingNextPage ? 'Fetching…' : 'Older jobs'}
        </Button>
      )}
    </>
  )
}

function JobRow({ line: { id, name, place, client, sheets, updatedAt } }: { line: JobLine }) {
  return (
    <li>
      <Link
        href={`/jobs/${id}`}
        prefetch={false}
        className="grid gap-1 rounded-plate border border-rule bg-card p-5 text-ink no-underline hover:border-ink max-sm:p-4"
      >
        <b className="font-head text-[22px]">{name}</b>
        <span className="text-mute">{[place, client].filter(Boolean).join(' · ')}</span>
        <span className="text-mute">
          {sheets === 1 ? '1 cut sheet' : `${sheets} cut sheets`}, changed {dayInWords(updatedAt)}
        </span>
      </Link>
    </li>
  )
}

function NoJobs({ archived, writable }: { archived: 'yes' | 'no'; writable: boolean }) {
  if (archived === 'yes')
    return <EmptyState title="Nothing put away">Jobs that are done can be put away; they stay readable.</EmptyState>
  return (
    <EmptyState
      title="No job yet"
      action={
        writable && (
          <ButtonLink href="/handbook/handrail" prefetch={false} variant="primary">
            Measure a stair
          </ButtonLink>
        )
      }
    >
      Open a job for a stair, then save its cut sheet there. Every revision is kept.
    </EmptyState>
  )
}
