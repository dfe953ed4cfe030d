'use client'

import { useState } from 'react'
import type { Paper, SheetAsk } from '@/lib/schemas/sheet'
import { openSheet } from '../calculator/print-sheet'
import { Button, ButtonLink } from '../ui/button'

interface PrintActionsProps {
  ask: Omit<SheetAsk, 'paper'>
  back: string
}

/** Print this page, or fetch it as a PDF drawn for one paper. */
export function PrintActions({ ask, back }: PrintActionsProps) {
  const [said, setSaid] = useState('')
  const fetchPdf = async (paper: Paper) => {
    setSaid('Drawing the PDF…')
    setSaid((await openSheet('handrail', { ...ask, paper })) ? '' : 'The PDF did not come. Print this page instead.')
  }
  return (
    <div className="actions no-print">
      <Button variant="primary" onClick={() => window.print()}>
        Print
      </Button>
      <Button onClick={() => void fetchPdf('letter')}>PDF, Letter</Button>
      <Button onClick={() => void fetchPdf('a4')}>PDF, A4</Button>
      <ButtonLink variant="quiet" href={back} prefetch={false}>
        Back to the measure
      </ButtonLink>
      <p role="status" className="basis-full text-mute empty:hidden">
        {said}
      </p>
    </div>
  )
}
