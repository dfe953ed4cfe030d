import { infiniteQueryOptions, queryOptions } from '@tanstack/react-query'
import type { JobChange, JobForm } from '@/lib/schemas/job'
import type { JobLine, JobView, Page } from '@/lib/schemas/views'
import { send } from './send'

const pathOf = (id: string) => `/api/jobs/${encodeURIComponent(id)}`

/** The job book a page at a time: jobs in hand, or those put away. */
export function jobsQuery(archived: 'yes' | 'no' = 'no') {
  return infiniteQueryOptions({
    queryKey: ['jobs', { archived }],
    queryFn: ({ pageParam, signal }) => {
      const asked = new URLSearchParams({ archived, ...(pageParam === null ? {} : { cursor: pageParam }) })
      return send<Page<JobLine>>('GET', `/api/jobs?${asked}`, { signal })
    },
    initialPageParam: null as string | null,
    getNextPageParam: ({ next }) => next,
  })
}

/** One job with its sheets. */
export function jobQuery(id: string) {
  return queryOptions({
    queryKey: ['jobs', id],
    queryFn: ({ signal }) => send<JobView>('GET', pathOf(id), { signal }),
  })
}

/** Opens a job. A repeat with the same key opens no second one. */
export const createJob = (form: JobForm, key: string) =>
  send<{ id: string; version: number }>('POST', '/api/jobs', { body: form, key })

/** Changes the named fields of a job; gives its new version. @throws ProblemError 409 with `current` */
export const changeJob = (id: string, change: JobChange) =>
  send<{ version: number }>('PATCH', pathOf(id), { body: change })

/** Puts a job away. @throws ProblemError 409 with `current` */
export const archiveJob = (id: string, version: number) =>
  send<{ version: number }>('DELETE', pathOf(id), { body: { version } })
