import Link from 'next/link'
import { SheetPaper } from '@/components/sheet/sheet-paper'
import { ButtonLink } from '@/components/ui/button'
import { ProblemState } from '@/components/ui/states'
import type { Sheet } from '@/lib/print/sheet/sheet'
import type { RevisionLine, SheetView } from '@/lib/schemas/views'
import { dayInWords } from './day'
import { PrintButton } from './print-button'
import { RevisionList } from './revision-list'

interface SavedSheetProps {
  view: SheetView
  revisions: readonly RevisionLine[]
  /** As it is printed; null when its calculator is no longer there. */
  paper: Sheet | null
  /** Where its measure is opened to be revised. */
  revisePath: string
}

/** One revision of a kept sheet, as it is printed, with what can be done with it. */
export function SavedSheet({ view, revisions, paper, revisePath }: SavedSheetProps) {
  const path = `/jobs/${view.jobId}/sheets/${view.sheet}`
  const current = view.revision === view.currentRevision
  return (
    <>
      <div className="no-print">
        <p className="crumb">
          <Link href="/jobs" prefetch={false}>
            Job book
          </Link>{' '}
          ·{' '}
          <Link href={`/jobs/${view.jobId}`} prefetch={false}>
            {view.jobName}
          </Link>
        </p>
        <h1>{view.name}</h1>
        <p className="lede">
          Sheet {view.sheet}, revision {view.revision}
          {view.note && `: ${view.note.replace(/\.$/, '')}`}. Saved by {view.createdBy}, {dayInWords(view.createdAt)}.
        </p>
        {!current && <Superseded path={path} by={view.currentRevision} />}
        <SheetActs view={view} path={path} revisePath={current ? revisePath : null} />
      </div>
      <div className="grid items-start gap-8 lg:grid-cols-[minmax(0,780px)_minmax(240px,1fr)] print:block">
        {paper ? (
          <SheetPaper sheet={paper} />
        ) : (
          <ProblemState title="This sheet cannot be drawn any more">
            It was saved with the calculator {view.calculator}, which is no longer in the handbook. Its numbers are
            still kept.
          </ProblemState>
        )}
        <section aria-labelledby="revisions" className="no-print">
          <h2 id="revisions" className="mb-3">
            Revisions
          </h2>
          <RevisionList path={path} revisions={revisions} shown={view.revision} />
        </section>
      </div>
    </>
  )
}

function Superseded({ path, by }: { path: string; by: number }) {
  return (
    <p className="mb-5 max-w-[780px] border-l-8 border-l-off bg-card p-4 text-lg">
      <b>Superseded by revision {by}.</b> Do not cut from this one.{' '}
      <Link href={path} prefetch={false}>
        Open revision {by}
      </Link>
    </p>
  )
}

interface SheetActsProps {
  view: SheetView
  path: string
  revisePath: string | null
}

function SheetActs({ view: { revision, writable }, path, revisePath }: SheetActsProps) {
  const pdf = (paper: 'letter' | 'a4') => `/api${path}/pdf?revision=${revision}&paper=${paper}`
  return (
    <div className="mb-6 flex flex-wrap gap-3">
      <PrintButton />
      {writable && revisePath && (
        <ButtonLink href={revisePath} prefetch={false}>
          Revise
        </ButtonLink>
      )}
      {(['letter', 'a4'] as const).map((paper) => (
        <ButtonLink key={paper} variant="quiet" href={pdf(paper)} prefetch={false} target="_blank">
          PDF, {paper === 'a4' ? 'A4' : 'Letter'}
        </ButtonLink>
      ))}
      {revision > 1 && (
        <ButtonLink variant="quiet" href={`${path}/compare?was=${revision - 1}&is=${revision}`} prefetch={false}>
          What changed
        </ButtonLink>
      )}
    </div>
  )
}
