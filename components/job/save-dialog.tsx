'use client'

import Link from 'next/link'
import { useEffect, useRef } from 'react'
import { Button } from '@/components/ui/button'
import { useMe } from '@/components/ui/me'
import { LoadingState } from '@/components/ui/states'
import { QueryProvider } from './query-provider'
import { ReviseForm } from './revise-form'
import { SaveForm } from './save-form'
import type { Saving } from './saving'
import type { SheetPlace } from './sheet-place'

export interface SaveDialogProps extends Saving {
  title: string
  place: SheetPlace | null
  onClose: () => void
}

/** Where a measure is kept; signed out, says where to sign in and comes back here. */
export function SaveDialog({ title, place, onClose, ...saving }: SaveDialogProps) {
  const dialog = useRef<HTMLDialogElement>(null)
  const me = useMe()
  useEffect(() => dialog.current?.showModal(), [])
  const close = () => dialog.current?.close()
  return (
    <dialog ref={dialog} className="sheet-dialog" aria-labelledby="save-title" onClose={onClose}>
      <h2 id="save-title" className="mb-4 text-3xl">
        {title}
      </h2>
      {me === undefined && <LoadingState title="Opening the job book…" />}
      {me?.role === 'journeyman' && (
        <QueryProvider>
          {place?.sheet === undefined ? (
            <SaveForm {...saving} jobId={place?.job} onClose={close} />
          ) : (
            <ReviseForm {...saving} opened={place} onClose={close} />
          )}
        </QueryProvider>
      )}
      {me !== undefined && me?.role !== 'journeyman' && <NotHere signedIn={me !== null} onClose={close} />}
    </dialog>
  )
}

function NotHere({ signedIn, onClose }: { signedIn: boolean; onClose: () => void }) {
  const back = `?from=${encodeURIComponent(`${location.pathname}${location.search}`)}`
  return (
    <>
      {signedIn ? (
        <p className="mb-5">Journeymen keep a job book. Your sign-in does not; you can print the sheet all the same.</p>
      ) : (
        <p className="mb-5">
          Cut sheets are kept in a job book. <Link href={`/sign-in${back}`}>Sign in</Link> or{' '}
          <Link href={`/start${back}`}>start a job book</Link>; your numbers stay in the address and come back with you.
        </p>
      )}
      <Button onClick={onClose}>Close</Button>
    </>
  )
}
