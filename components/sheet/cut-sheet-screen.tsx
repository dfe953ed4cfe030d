'use client'

import { useMemo, useState, useSyncExternalStore } from 'react'
import { answer } from '@/lib/calculators/answer'
import { asAny } from '@/lib/calculators/define'
import { handrail } from '@/lib/calculators/field/handrail'
import { blankHead } from '@/lib/print/sheet/sheet'
import { precisionOf } from '@/lib/schemas/precision'
import { readMeasure, measureParameter } from '../calculator/handrail/measure-address'
import { inputsOf } from '../calculator/handrail/measure-inputs'
import { ButtonLink } from '../ui/button'
import { EmptyState, LoadingState, ProblemState } from '../ui/states'
import { usePreferences } from '../ui/use-preferences'
import { HeadFields } from './head-fields'
import { PrintActions } from './print-actions'
import { railPath, railSheet } from './rail-sheet'
import { SheetPaper } from './sheet-paper'

const calculator = asAny(handrail)
const never = () => () => {}

/** The cut sheet of the measure in the address; worked out here, so that it prints with no server in reach. */
export function CutSheetScreen() {
  const search = useSyncExternalStore(
    never,
    () => location.search,
    () => null,
  )
  const measure = useMemo(
    () => (search === null ? null : readMeasure(new URLSearchParams(search).get(measureParameter))),
    [search],
  )
  const inputs = useMemo(() => (measure ? inputsOf(measure) : null), [measure])
  if (search === null) return <LoadingState title="Drawing the cut sheet…" />
  if (!inputs) return <NoMeasure />
  return <MeasuredSheet inputs={inputs} />
}

function NoMeasure() {
  return (
    <EmptyState
      title="No measure on this sheet"
      action={<ButtonLink href="/handbook/handrail">Give a measure</ButtonLink>}
    >
      A cut sheet comes from a field measure. Give the measure of the stair, then print it from there.
    </EmptyState>
  )
}

function MeasuredSheet({ inputs }: { inputs: Readonly<Record<string, unknown>> }) {
  const preferences = usePreferences()
  const [head, setHead] = useState(blankHead)
  const precision = precisionOf(preferences)
  const answered = useMemo(() => answer(calculator, inputs, precisionOf(preferences)), [inputs, preferences])
  const back = railPath(inputs)
  if (!answered.ok)
    return (
      <ProblemState
        title="These measures make no rail yet"
        action={<ButtonLink href={back}>Mend the measure</ButtonLink>}
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
