'use client'

import { useQuery } from '@tanstack/react-query'
import Link from 'next/link'
import { useState, type ComponentProps } from 'react'
import { HandrailScreen } from '@/components/calculator/handrail/handrail-screen'
import { savedStore } from '@/components/calculator/handrail/use-handrail'
import { Button, ButtonLink } from '@/components/ui/button'
import { LoadingState, ProblemState } from '@/components/ui/states'
import { ProblemError } from '@/lib/queries/send'
import { sentenceOf } from '@/lib/queries/sentence'
import { openedQuery } from '@/lib/queries/sheets'
import type { SheetView } from '@/lib/schemas/views'
import { QueryProvider } from './query-provider'
import type { OpenedSheet } from './sheet-place'

type Screen = Omit<ComponentProps<typeof HandrailScreen>, 'store'>

interface KeptMeasureProps {
  opened: OpenedSheet
  screen: Screen
}

/** The field sheet filled with what a kept cut sheet was measured as, to be changed and saved as its next revision. */
export function KeptMeasure(props: KeptMeasureProps) {
  return (
    <QueryProvider>
      <Fetched {...props} />
    </QueryProvider>
  )
}

function Fetched({ opened, screen }: KeptMeasureProps) {
  const kept = useQuery(openedQuery(opened))
  if (kept.isPending) return <LoadingState title="Opening the saved measure…" />
  if (kept.data) return <Opened view={kept.data} screen={screen} />
  return <NotOpened error={kept.error} onRetry={() => void kept.refetch()} />
}

function Opened({ view, screen }: { view: SheetView; screen: Screen }) {
  const [store] = useState(() => savedStore(view.inputs))
  const path = `/jobs/${view.jobId}/sheets/${view.sheet}`
  return (
    <>
      <p className="mb-4">
        <Link href={path} prefetch={false}>
          {view.jobName}, {view.name}
        </Link>
        , revision {view.revision}, measured by {view.measuredBy}.
      </p>
      <HandrailScreen {...screen} store={store} />
    </>
  )
}

function NotOpened({ error, onRetry }: { error: Error; onRetry: () => void }) {
  const signedOut = error instanceof ProblemError && error.problem.status === 401
  const from = encodeURIComponent(`${location.pathname}${location.search}`)
  return (
    <ProblemState
      title={signedOut ? 'Sign in to open this sheet' : 'The saved sheet did not open'}
      action={
        signedOut ? (
          <ButtonLink href={`/sign-in?from=${from}`} prefetch={false} variant="primary">
            Sign in
          </ButtonLink>
        ) : (
          <>
            <Button variant="primary" onClick={onRetry}>
              Try again
            </Button>
            <ButtonLink href="/jobs" prefetch={false}>
              Job book
            </ButtonLink>
          </>
        )
      }
    >
      {signedOut ? 'It is kept in a job book; you come back here.' : sentenceOf(error)}
    </ProblemState>
  )
}
