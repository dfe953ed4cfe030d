'use client'

import { lazy, Suspense, useMemo, useSyncExternalStore } from 'react'
import { measureParameter, readMeasure } from '../calculator/handrail/measure-address'
import { ButtonLink } from '../ui/button'
import { EmptyState, LoadingState } from '../ui/states'

/** Engine, drawing and paper are fetched once there is a measure to print. */
const MeasuredSheet = lazy(async () => ({ default: (await import('./measured-sheet')).MeasuredSheet }))
const drawing = <LoadingState title="Drawing the cut sheet…" />
const never = () => () => undefined

/** The cut sheet of the measure in the address; worked out here, so that it prints with no server in reach. */
export function CutSheetScreen() {
  const search = useSyncExternalStore(
    never,
    () => location.search,
    () => null,
  )
  const measure = useMemo(() => readMeasure(new URLSearchParams(search ?? '').get(measureParameter)), [search])
  if (search === null) return drawing
  if (!measure) return <NoMeasure />
  return (
    <Suspense fallback={drawing}>
      <MeasuredSheet measure={measure} />
    </Suspense>
  )
}

function NoMeasure() {
  const give = (
    <ButtonLink href="/handbook/handrail" prefetch={false}>
      Give a measure
    </ButtonLink>
  )
  return (
    <EmptyState title="No measure on this sheet" action={give}>
      A cut sheet comes from a field measure. Give the measure of the stair, then print it from there.
    </EmptyState>
  )
}
