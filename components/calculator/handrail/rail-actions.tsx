'use client'

import { lazy, Suspense, useState } from 'react'
import { Button, ButtonLink } from '../../ui/button'
import { untilAwake } from './awake'
import { measureQuery } from './measure-address'
import { mirrorHand } from './measure-edits'
import type { HandrailState } from './use-handrail'

/** The example is not kept: fetched once there is a measure of one's own. */
const SaveToJob = lazy(async () => ({ default: (await import('../../job/save-to-job')).SaveToJob }))

/** Fetched when somebody stirs, so that it is there when the network is not. */
const plainText = () => import('./plain-text')
if (typeof window !== 'undefined') void untilAwake().then(plainText)

/** Print the cut sheet, keep it in a job, copy it as text. Numbers left from before are not handed on. */
export function RailActions({ state }: { state: HandrailState }) {
  const { store, raw, rail, stale, measure, precision, preferences, origin } = state
  const [said, setSaid] = useState('')
  const copy = async () => {
    if (!rail) return
    const address = `${location.origin}${location.pathname}${measureQuery(measure)}`
    try {
      const { cutListText } = await plainText()
      await navigator.clipboard.writeText(cutListText(rail, { precision, preferences }, address))
      setSaid('Copied.')
    } catch {
      setSaid('This device does not let a page copy. Select the numbers and copy them by hand.')
    }
  }
  if (stale || !rail)
    return <p className="rail-actions-wait">Print, save and copy stand here as soon as the measures are whole.</p>
  return (
    <div className="actions rail-actions no-print">
      {origin === 'own' && (
        <Suspense fallback={<Button disabled>Save to a job</Button>}>
          <SaveToJob calculator="handrail" inputs={raw} />
        </Suspense>
      )}
      <ButtonLink href={`/handbook/handrail/sheet${measureQuery(measure)}`} prefetch={false}>
        Print cut sheet
      </ButtonLink>
      <Button variant="quiet" onClick={() => void copy()}>
        Copy as text
      </Button>
      <Button
        variant="quiet"
        onClick={() => store.replace(mirrorHand(measure), 'The hand is mirrored; not one length changes.')}
      >
        Mirror the hand
      </Button>
      <p role="status" className="basis-full text-mute empty:hidden">
        {said}
      </p>
    </div>
  )
}
