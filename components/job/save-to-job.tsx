'use client'

import Link from 'next/link'
import { useRef } from 'react'
import { Button } from '@/components/ui/button'
import { useMe } from '@/components/ui/me'
import { QueryProvider } from './query-provider'
import { SaveForm } from './save-form'
import type { Saving } from './saving'

/** Opens the dialog that keeps a cut sheet in a job; signed out, says where to sign in and comes back here. */
export function SaveToJob(saving: Saving) {
  const dialog = useRef<HTMLDialogElement>(null)
  const me = useMe()
  const close = () => dialog.current?.close()
  return (
    <>
      <Button variant="primary" onClick={() => dialog.current?.showModal()} aria-haspopup="dialog">
        Save to a job
      </Button>
      <dialog ref={dialog} className="sheet-dialog" aria-labelledby="save-title">
        <h2 id="save-title" className="mb-4 text-3xl">
          Save to a job
        </h2>
        {me?.role === 'journeyman' && (
          <QueryProvider>
            <SaveForm {...saving} onClose={close} />
          </QueryProvider>
        )}
        {me?.role !== 'journeyman' && <NotHere signedIn={Boolean(me)} onClose={close} />}
      </dialog>
    </>
  )
}

function NotHere({ signedIn, onClose }: { signedIn: boolean; onClose: () => void }) {
  const from = typeof window === 'undefined' ? '/jobs' : `${window.location.pathname}${window.location.search}`
  const back = `?from=${encodeURIComponent(from)}`
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
