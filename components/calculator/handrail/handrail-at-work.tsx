'use client'

import { lazy, Suspense, type ComponentProps } from 'react'
import { useSheetPlace } from '../../job/use-sheet-place'
import { HandrailScreen } from './handrail-screen'

/** Fetched by those only who open the page for a kept sheet. */
const KeptMeasure = lazy(async () => ({ default: (await import('../../job/kept-measure')).KeptMeasure }))

/** The handbook's handrail page: one's own measure, or that of the sheet in the address. */
export function HandrailAtWork(screen: Omit<ComponentProps<typeof HandrailScreen>, 'store'>) {
  const place = useSheetPlace()
  if (place?.sheet === undefined) return <HandrailScreen {...screen} />
  return (
    <Suspense fallback={null}>
      <KeptMeasure opened={place} screen={screen} />
    </Suspense>
  )
}
