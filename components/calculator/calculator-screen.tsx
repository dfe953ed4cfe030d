'use client'

import type { ReactNode } from 'react'
import type { AnyCalculator } from '@/lib/calculators/define'
import type { CalculatorId } from '@/lib/calculators/load'
import { CautionPanel } from '../ui/caution-panel'
import { CalculatorActions } from './actions'
import { BeingOff } from './being-off'
import { Bench } from './bench'
import { EveryNumber } from './every-number'
import type { Related } from './related'
import { RelatedLinks } from './related-links'
import { useBench } from './use-bench'
import { useLastUsed } from './last-used'
import { Working, type Typeset } from './working'

interface CalculatorScreenProps {
  id: CalculatorId
  typeset: Typeset
  related: readonly Related[]
  /** Sources and proof, which do not change with the numbers. */
  children?: ReactNode
}

/** True for a result that has no card of its own. */
const isUnseen = ({ outputs, glance }: AnyCalculator, name: string) =>
  outputs[name] !== undefined && !glance.includes(name)

/** A calculator with all that belongs to its numbers. */
export function CalculatorScreen({ id, typeset, related, children }: CalculatorScreenProps) {
  const bench = useBench(id)
  const { calculator, raw, answer, stale, asked, precision, cautions, preferences } = bench
  useLastUsed(id)
  // A phone's answer has no room for a sentence: what stands beside a result there stands under the bench.
  const besideResults = cautions.filter(({ beside }) => beside !== undefined && calculator.glance.includes(beside))
  const standingAlone = cautions.filter(({ beside }) => beside === undefined || isUnseen(calculator, beside))
  return (
    <>
      <Bench bench={bench}>
        <CalculatorActions calculator={calculator} raw={raw} answer={stale ? null : answer} precision={asked} />
      </Bench>
      <div className="below">
        <div className="below-main">
          {answer && <Working calculator={calculator} steps={answer.steps} stale={stale} typeset={typeset} />}
          {answer && (
            <details className="more">
              <summary>Every number</summary>
              <EveryNumber
                outputs={calculator.outputs}
                solved={answer.outputs}
                precision={precision}
                units={preferences.units}
              />
            </details>
          )}
          {answer && <BeingOff calculator={calculator} answer={answer} precision={precision} />}
          {children}
        </div>
        <div className="below-side">
          {besideResults.map(({ signal, text }) => (
            <CautionPanel key={text} signal={signal} className="phone-only">
              {text}
            </CautionPanel>
          ))}
          {standingAlone.map(({ signal, text }) => (
            <CautionPanel key={text} signal={signal}>
              {text}
            </CautionPanel>
          ))}
          <RelatedLinks related={related} fields={calculator.inputs} raw={raw} />
        </div>
      </div>
    </>
  )
}
