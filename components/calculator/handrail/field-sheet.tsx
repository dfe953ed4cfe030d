'use client'

import { Fragment, lazy, Suspense, useRef } from 'react'
import { flushSync } from 'react-dom'
import { Button } from '../../ui/button'
import { usePad } from '../use-pad'
import { usePhone } from '../use-phone'
import { useTypedEarly } from '../use-typed-early'
import { EndCard } from './end-card'
import { ExtrasCard } from './extras-card'
import { numberAt } from './fields-at'
import { FlightCard } from './flight-card'
import { textAt, withText, type Measure } from './measure'
import { addFlight, mostFlights } from './measure-edits'
import { boxId, Measured } from './measured'
import { partMarks } from './part-marks'
import type { PlacedFault } from './placed-faults'
import { RailCard } from './rail-card'
import { CautionsBeside, SheetCard } from './sheet-card'
import { FieldSheetContext } from './sheet-context'
import { shownPaths } from './shown-paths'
import type { HandrailState } from './use-handrail'

/** Strip and pad come with the first row that is chosen on a phone. */
const PadDock = lazy(async () => ({ default: (await import('../pad-dock')).PadDock }))

/** The handrail at work, with its faults at the boxes of the sheet. */
type FieldSheetInput = Omit<HandrailState, 'faults'> & { faults: readonly PlacedFault[] }

/** The stair as it was measured, from the bottom up: reads like a field sheet. */
export function FieldSheet({ state }: { state: FieldSheetInput }) {
  const { measure, store, faults, answer, stale, cautions, precision, rail } = state
  const form = useRef<HTMLFormElement>(null)
  const phone = usePhone()
  const paths = shownPaths(measure)
  const typed = Object.fromEntries(paths.map((path) => [path, textAt(measure, path)]))
  useTypedEarly(form, typed, (changed) => store.type((now) => withTexts(now, changed)))
  const pad = usePad({
    ready: false,
    names: paths,
    textOf: (path) => textAt(measure, path),
    write: (path, text) => store.type((now) => withText(now, path, text)),
  })
  const notes = stale ? [] : (answer?.warnings ?? [])
  const marks = partMarks(rail?.solved.parts ?? [])
  const active = pad.active ?? ''
  const add = () => {
    flushSync(() => store.replace(addFlight(measure), 'A landing and a flight are added.'))
    // The new cards push this button down: the hand goes to the first of their boxes.
    document.getElementById(boxId(`landings[${measure.landings.length}].length`))?.focus()
  }
  return (
    <FieldSheetContext value={{ measure, store, faults, notes, cautions, pad, phone, precision }}>
      <form ref={form} className="field-sheet" aria-label="Field sheet" onSubmit={(event) => event.preventDefault()}>
        <RailCard />
        <EndCard end="bottom" mark={marks.bottom} />
        {measure.flights.map((_, i) => (
          <Fragment key={i}>
            {i > 0 && <LandingCard index={i - 1} mark={marks.landings[i - 1]} />}
            <FlightCard
              index={i}
              mark={marks.flights[i]}
              closing={stale ? undefined : rail?.solved.closing.find(({ flight }) => flight === i + 1)}
            />
          </Fragment>
        ))}
        <Button disabled={measure.flights.length >= mostFlights} onClick={add}>
          Add a flight
        </Button>
        <EndCard end="top" mark={marks.top} />
        <ExtrasCard />
        {phone && pad.open && (
          <Suspense fallback={null}>
            <PadDock
              pad={pad}
              field={numberAt(measure, active)}
              text={textAt(measure, active)}
              precision={precision}
              form={form}
            />
          </Suspense>
        )}
      </form>
    </FieldSheetContext>
  )
}

const withTexts = (measure: Measure, texts: Readonly<Record<string, unknown>>): Measure =>
  Object.entries(texts).reduce((now, [path, text]) => withText(now, path, String(text)), measure)

function LandingCard({ index, mark }: { index: number; mark?: string }) {
  return (
    <SheetCard title={`Landing ${index + 1}`} mark={mark}>
      <Measured path={`landings[${index}].length`} />
      <div className="measure-pair">
        <Measured path={`landings[${index}].slopeInPerFt`} />
        <Measured path={`landings[${index}].railHeight`} optional />
      </div>
      {index === 0 && <CautionsBeside name="landings" />}
    </SheetCard>
  )
}
