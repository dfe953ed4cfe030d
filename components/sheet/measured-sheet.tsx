'use client'

import { useMemo, useState } from 'react'
import { answer as answerOf, type Answer } from '@/lib/calculators/answer'
import { asAny } from '@/lib/calculators/define'
import { handrail } from '@/lib/calculators/field/handrail'
import { blankHead, type SheetReading } from '@/lib/print/sheet/sheet'
import type { Preferences } from '@/lib/schemas/account'
import { precisionOf } from '@/lib/schemas/precision'
import type { RawInputs } from '../calculator/address'
import type { Measure } from '../calculator/handrail/measure'
import { inputsOf } from '../calculator/handrail/measure-inputs'
import { ButtonLink } from '../ui/button'
import { ProblemState } from '../ui/states'
import { usePreferences } from '../ui/use-preferences'
import { HeadFields } from './head-fields'
import { PrintActions } from './print-actions'
import { railPath, railSheet, railSketches } from './rail-sheet'
import { SheetPaper } from './sheet-paper'

const calculator = asAny(handrail)

/** The cut sheet of a measure, or what is off in it. */
export function MeasuredSheet({ measure }: { measure: Measure }) {
  const preferences = usePreferences()
  const inputs = useMemo(() => inputsOf(measure), [measure])
  const reading = useMemo(() => ({ precision: precisionOf(preferences), preferences }), [preferences])
  const answered = useMemo(() => answerOf(calculator, inputs, reading.precision), [inputs, reading])
  if (answered.ok) return <Printable {...{ inputs, reading }} answer={answered.answer} />
  const mend = (
    <ButtonLink href={railPath(inputs)} prefetch={false}>
      Mend the measure
    </ButtonLink>
  )
  return (
    <ProblemState title="These measures make no rail yet" action={mend}>
      <ul>
        {answered.errors.map(({ field, message }) => (
          <li key={`${field} ${message}`}>{message}</li>
        ))}
      </ul>
    </ProblemState>
  )
}

interface PrintableProps {
  inputs: RawInputs
  answer: Answer
  reading: SheetReading & { preferences: Preferences }
}

function Printable({ inputs, answer, reading }: PrintableProps) {
  const [head, setHead] = useState(blankHead)
  const sketches = useMemo(() => railSketches({ answer, reading }), [answer, reading])
  const back = railPath(inputs)
  const { precision, preferences } = reading
  const { units, sawSquare } = preferences
  return (
    <>
      <PrintActions ask={{ inputs, precision, units, sawSquare, head }} back={back} />
      <HeadFields head={head} onChange={setHead} />
      <SheetPaper sheet={railSheet({ head, answer, reading, address: `${location.origin}${back}` }, sketches)} />
    </>
  )
}
