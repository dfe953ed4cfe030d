'use client'

import { useState } from 'react'
import type { Answer } from '@/lib/calculators/answer'
import type { AnyCalculator } from '@/lib/calculators/define'
import type { Precision } from '@/lib/calculators/fields'
import { SaveToJob } from '../job/save-to-job'
import { Button } from '../ui/button'
import { usePreferences } from '../ui/use-preferences'
import { writeAddress, type RawInputs } from './address'
import { answerText } from './answer-text'
import { openSheet } from './print-sheet'

interface CalculatorActionsProps {
  calculator: AnyCalculator
  raw: RawInputs
  /** Null while nothing can be computed: nothing to keep then. */
  answer: Answer | null
  precision: Precision
}

/** Save to a job, print the sheet, copy as text. */
export function CalculatorActions({ calculator, raw, answer, precision }: CalculatorActionsProps) {
  const [said, setSaid] = useState('')
  const { id, inputs } = calculator
  const { units, sawSquare } = usePreferences()
  const query = writeAddress(inputs, raw)
  const print = async () => {
    setSaid('Drawing the sheet…')
    if (await openSheet(id, { inputs: raw, precision, units, sawSquare })) return setSaid('')
    setSaid('The sheet did not come; printing this page instead.')
    window.print()
  }
  const copy = async () => {
    if (!answer) return
    const address = `${location.origin}${location.pathname}${query}`
    try {
      await navigator.clipboard.writeText(answerText(calculator, raw, answer, address, precision))
      setSaid('Copied.')
    } catch {
      setSaid('This device does not let a page copy. Select the numbers and copy them by hand.')
    }
  }
  return (
    <div className="actions no-print">
      {answer && <SaveToJob calculator={id} inputs={raw} />}
      <Button disabled={!answer} onClick={() => void print()}>
        Print sheet
      </Button>
      <Button variant="quiet" disabled={!answer} onClick={() => void copy()}>
        Copy as text
      </Button>
      <p role="status" className="basis-full text-mute empty:hidden">
        {said}
      </p>
    </div>
  )
}
