'use client'

import { BracketMarks } from './bracket-marks'
import { CodeRows } from './code-rows'
import { Joints } from './joints'
import { PartsTable } from './parts-table'
import { Sticks } from './sticks-section'
import type { HandrailState, Rail } from './use-handrail'
import { WeldLines } from './weld-lines'

/** What the rail comes to, in the order in which it is worked. */
export function RailResults({ state, rail }: { state: HandrailState; rail: Rail }) {
  const { precision, preferences, stale, cautions } = state
  const reading = { precision, preferences }
  const { solved, given } = rail
  const remarks = stale ? [] : solved.warnings
  return (
    <div className="rail-results" data-stale={stale || undefined}>
      {stale && <p className="results-stale">These are still the last numbers that could be worked out.</p>}
      {remarks.length > 0 && (
        <ul className="rail-remarks" aria-label="Look at these before cutting">
          {remarks.map(({ message }) => (
            <li key={message}>{message}</li>
          ))}
        </ul>
      )}
      <PartsTable parts={solved.parts} section={given.section} reading={reading} />
      <div className="rail-two">
        <BracketMarks brackets={solved.brackets} reading={reading} cautions={cautions} />
        <Joints joints={solved.joints} parts={solved.parts} returns={solved.returns} reading={reading} />
      </div>
      <Sticks rail={rail} reading={reading} />
      <WeldLines weld={solved.weld} />
      {solved.checks && <CodeRows rows={solved.checks} />}
    </div>
  )
}
