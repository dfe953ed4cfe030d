'use client'

import { lazy, Suspense, type ReactNode } from 'react'
import { useLastUsed } from '../last-used'
import type { Typeset } from '../working'
import { FieldSheet } from './field-sheet'
import './handrail.css'
import { LitProvider } from './lit'
import { OriginBar } from './origin-bar'
import { placedFaults } from './placed-faults'
import { RailActions } from './rail-actions'
import { RailBeingOffLater, RailCautionsLater, RailPlateLater, RailResultsLater, WorkingLater } from './later-drawings'
import { useMadeAhead } from './use-made-ahead'
import type { MeasureStore } from './measure-store'
import { UndoLine } from './undo-line'
import { pageStore, useHandrail, useKept } from './use-handrail'

/** The sheet is whole for most who come to it. */
const FaultSummary = lazy(async () => ({ default: (await import('./fault-summary')).FaultSummary }))

interface HandrailScreenProps {
  /** The sheet to work on; left out, the one of the handbook's page. */
  store?: MeasureStore
  typeset: Typeset
  /** Ways on. */
  aside?: ReactNode
  /** Sources and proof, which do not change with the numbers. */
  children?: ReactNode
}

/** A stair as it was measured, and the whole rail that follows from it. */
export function HandrailScreen({ store = pageStore, ...rest }: HandrailScreenProps) {
  const kept = useKept(store)
  return (
    <LitProvider>
      <OriginBar kept={kept} store={store} />
      <Bench key={kept.sheet} store={store} {...rest} />
    </LitProvider>
  )
}

function Bench({ store, typeset, aside, children }: HandrailScreenProps & { store: MeasureStore }) {
  const state = useHandrail(store)
  const { calculator, rail, answer, stale, precision, preferences, cautions } = state
  const faults = placedFaults(state.measure, state.faults)
  useLastUsed(calculator.id)
  useMadeAhead(state.origin, preferences)
  return (
    <>
      <div className="rail-bench">
        <FieldSheet state={{ ...state, faults }} />
        <div className="rail-view">
          <div className="rail-head">
            {rail ? (
              <RailPlateLater {...{ rail, precision, preferences, stale }} />
            ) : (
              <p className="rail-none">
                Give the measures from the bottom of the stair up, and the rail is drawn here.
              </p>
            )}
            <UndoLine kept={state} store={store} />
            {faults.length > 0 && (
              <Suspense fallback={null}>
                <FaultSummary faults={faults} shown={rail !== null} />
              </Suspense>
            )}
          </div>
          <RailActions state={state} />
          {rail && <RailResultsLater state={state} rail={rail} />}
          <RailCautionsLater cautions={cautions} />
        </div>
      </div>
      <div className="below">
        <div className="below-main">
          {answer && <WorkingLater calculator={calculator} steps={answer.steps} stale={stale} typeset={typeset} />}
          {rail && !stale && <RailBeingOffLater {...{ rail, precision }} measure={state.measure} />}
          {children}
        </div>
        <div className="below-side">{aside}</div>
      </div>
    </>
  )
}
