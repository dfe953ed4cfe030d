'use client'

import type { ReactNode } from 'react'
import { CautionPanel } from '../../ui/caution-panel'
import { useLastUsed } from '../last-used'
import { Working, type Typeset } from '../working'
import { FaultSummary } from './fault-summary'
import { FieldSheet } from './field-sheet'
import './handrail.css'
import { LitProvider } from './lit'
import { OriginBar } from './origin-bar'
import { placedFaults } from './placed-faults'
import { RailActions } from './rail-actions'
import { RailPlate } from './rail-plate'
import { RailResults } from './rail-results'
import { useHandrail } from './use-handrail'

interface HandrailScreenProps {
  typeset: Typeset
  /** What saves this measure, where not the plain act does. */
  actions?: ReactNode
  /** Sources and proof, which do not change with the numbers. */
  children?: ReactNode
}

/** A stair as it was measured, and the whole rail that follows from it. */
export function HandrailScreen({ typeset, actions, children }: HandrailScreenProps) {
  const state = useHandrail()
  const { calculator, rail, answer, stale, precision, preferences, cautions } = state
  const faults = placedFaults(state.faults)
  useLastUsed(calculator.id)
  const alone = cautions.filter(({ beside }) => beside === undefined)
  return (
    <LitProvider>
      <OriginBar {...state} />
      <div className="rail-bench">
        <FieldSheet state={{ ...state, faults }} />
        <div className="rail-view">
          {rail ? (
            <RailPlate {...{ rail, precision, preferences, stale }} />
          ) : (
            <p className="rail-none">Give the measures from the bottom of the stair up, and the rail is drawn here.</p>
          )}
          <FaultSummary faults={faults} shown={rail !== null} />
          <RailActions state={state} actions={actions} />
        </div>
      </div>
      {rail && <RailResults state={state} rail={rail} />}
      <div className="below">
        <div className="below-main">
          {answer && <Working calculator={calculator} steps={answer.steps} stale={stale} typeset={typeset} />}
          {children}
        </div>
        <div className="below-side">
          {alone.map(({ signal, text }) => (
            <CautionPanel key={text} signal={signal}>
              {text}
            </CautionPanel>
          ))}
        </div>
      </div>
    </LitProvider>
  )
}
