'use client'

import { useState, type ComponentType } from 'react'
import { Button } from '@/components/ui/button'
import type { SaveDialogProps } from './save-dialog'
import type { Saving } from './saving'
import { useSheetPlace } from './use-sheet-place'

/**
 * Keeps a measure in a job, or as the next revision of the sheet that the page was opened for. The dialog brings forms
 * and lists along: it is fetched when it is asked for.
 */
export function SaveToJob(saving: Saving) {
  const [Dialog, setDialog] = useState<ComponentType<SaveDialogProps> | null>(null)
  const [said, setSaid] = useState('')
  const place = useSheetPlace()
  const title = place?.sheet === undefined ? 'Save to a job' : 'Save as a revision'
  const open = async () => {
    setSaid('Opening the job book…')
    try {
      const { SaveDialog } = await import('./save-dialog')
      setDialog(() => SaveDialog)
      setSaid('')
    } catch {
      setSaid('The job book did not open: no connection. Your numbers stay in the address of this page.')
    }
  }
  return (
    <>
      <Button variant="primary" onClick={() => void open()} aria-haspopup="dialog">
        {title}
      </Button>
      {Dialog && <Dialog {...saving} title={title} place={place} onClose={() => setDialog(null)} />}
      <p role="status" className="order-last basis-full text-mute empty:hidden">
        {said}
      </p>
    </>
  )
}
