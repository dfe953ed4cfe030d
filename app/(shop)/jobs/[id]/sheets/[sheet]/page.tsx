import type { Metadata } from 'next'
import { notFound } from 'next/navigation'
import { SavedSheet } from '@/components/job/saved-sheet'
import { keptSheet, revisePath } from '@/components/sheet/kept-sheet'
import { requireActor } from '@/lib/auth/session'
import { config } from '@/lib/config'
import { getCutSheet, listRevisions } from '@/lib/data/read-sheets'
import { orNotFound } from '@/lib/http/or-not-found'
import { revisionQuery, sheetParams } from '@/lib/schemas/job'

export const metadata: Metadata = { title: 'Cut sheet' }

export default async function SheetPage({ params, searchParams }: PageProps<'/jobs/[id]/sheets/[sheet]'>) {
  const place = sheetParams.safeParse(await params)
  const asked = revisionQuery.safeParse(await searchParams)
  if (!place.success || !asked.success) notFound()
  const { id, sheet } = place.data
  const actor = await requireActor(`/jobs/${id}/sheets/${sheet}`)
  const [view, revisions] = await Promise.all([
    orNotFound(getCutSheet(actor, id, sheet, asked.data.revision)),
    orNotFound(listRevisions(actor, id, sheet)),
  ])
  return (
    <SavedSheet
      view={view}
      revisions={revisions}
      paper={await keptSheet(view, actor.preferences, config().APP_ORIGIN)}
      revisePath={await revisePath(view)}
    />
  )
}
