'use client'

import { useMemo, useState } from 'react'
import { answer } from '@/lib/calculators/answer'
import { asAny } from '@/lib/calculators/define'
import { handrail } from '@/lib/calculators/field/handrail'
import { blankHead } from '@/lib/print/sheet/sheet'
import { precisionOf } from '@/lib/schemas/precision'
import type { Measure } from '../calculator/handrail/measure'
import { inputsOf } from '../calculator/handrail/measure-inputs'
import { ButtonLink } from '../ui/button'
import { ProblemState } from '../ui/states'
import { usePreferences } from '../ui/use-preferences'
import { HeadFields } from './head-fields'
import { PrintActions } from './print-actions'
import { railPath, railSheet } from './rail-sheet'
import { SheetPaper } from './sheet-paper'

const calculator = asAny(handrail)

/** The cut sheet of a measure, or what is off in it. */
export function MeasuredSheet({ measure }: { measure: Measure }) {
  const inputs = useMemo(() => inputsOf(measure), [measure])
  const preferences = usePreferences()
  const [head, setHead] = useState(blankHead)
  const precision = precisionOf(preferences)
  const answered = useMemo(() => answer(calculator, inputs, precisionOf(preferences)), [inputs, preferences])
  const back = railPath(inputs)
  if (!answered.ok)
    return (
      <ProblemState
        title="These measures make no rail yet"
        action={
          <ButtonLink href={back} prefetch={false}>
            Mend the measure
          </ButtonLink>
        }
      >
        <ul>
          {answered.errors.map(({ field, message }) => (
            <li key={`${field} ${message}`}>{message}</li>
          ))}
        </ul>
      </ProblemState>
    )
  const sheet = railSheet({
    head,
    answer: answered.answer,
    reading: { precision, preferences },
    address: `${location.origin}${back}`,
  })
  return (
    <>
      <PrintActions
        ask={{ inputs, precision, units: preferences.units, sawSquare: preferences.sawSquare, head }}
        back={back}
      />
      <HeadFields head={head} onChange={setHead} />
      <SheetPaper sheet={sheet} />
    </>
  )
}
