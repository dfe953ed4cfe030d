import { queryOptions } from '@tanstack/react-query'
import type { SheetForm, SheetRevisionForm } from '@/lib/schemas/job'
import type { SheetView } from '@/lib/schemas/views'
import { send } from './send'

interface Place {
  sheet: number
  revision: number
}

const pathOf = (jobId: string, sheet?: number) =>
  `/api/jobs/${encodeURIComponent(jobId)}/sheets${sheet === undefined ? '' : `/${sheet}`}`

/** The revision that was opened to be revised. It never changes: what others save is another one. */
export function openedQuery({ job, sheet, revision }: { job: string; sheet: number; revision: number }) {
  return queryOptions({
    queryKey: ['jobs', job, 'sheets', sheet, revision],
    queryFn: ({ signal }) => send<SheetView>('GET', `${pathOf(job, sheet)}?revision=${revision}`, { signal }),
    staleTime: Infinity,
  })
}

/** Saves a new cut sheet. A repeat with the same key saves no second one. */
export const saveSheet = (jobId: string, form: SheetForm, key: string) =>
  send<Place>('POST', pathOf(jobId), { body: form, key })

/** Saves the next revision. @throws ProblemError 409 with `current`, the revision that stands */
export const reviseSheet = (jobId: string, sheet: number, form: SheetRevisionForm, key: string) =>
  send<Place>('POST', pathOf(jobId, sheet), { body: form, key })
