import { queryOptions } from '@tanstack/react-query'
import type { SheetForm, SheetRevisionForm } from '@/lib/schemas/job'
import type { RevisionLine, SheetView } from '@/lib/schemas/views'
import { send } from './send'

interface Place {
  sheet: number
  revision: number
}

const pathOf = (jobId: string, sheet?: number) =>
  `/api/jobs/${encodeURIComponent(jobId)}/sheets${sheet === undefined ? '' : `/${sheet}`}`

/** One revision of a cut sheet, the current one unless named. */
export function sheetQuery(jobId: string, sheet: number, revision?: number) {
  const asked = revision === undefined ? '' : `?revision=${revision}`
  return queryOptions({
    queryKey: ['jobs', jobId, 'sheets', sheet, revision ?? 'current'],
    queryFn: ({ signal }) => send<SheetView>('GET', `${pathOf(jobId, sheet)}${asked}`, { signal }),
  })
}

/** All revisions of a cut sheet, newest first. */
export function revisionsQuery(jobId: string, sheet: number) {
  return queryOptions({
    queryKey: ['jobs', jobId, 'sheets', sheet, 'revisions'],
    queryFn: ({ signal }) => send<RevisionLine[]>('GET', `${pathOf(jobId, sheet)}/revisions`, { signal }),
  })
}

/** Saves a new cut sheet. A repeat with the same key saves no second one. */
export const saveSheet = (jobId: string, form: SheetForm, key: string) =>
  send<Place>('POST', pathOf(jobId), { body: form, key })

/** Saves the next revision. @throws ProblemError 409 with `current`, the revision that stands */
export const reviseSheet = (jobId: string, sheet: number, form: SheetRevisionForm, key: string) =>
  send<Place>('POST', pathOf(jobId, sheet), { body: form, key })
