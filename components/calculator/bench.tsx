'use client'

import type { ReactNode } from 'react'
import { BenchPlate } from './bench-plate'
import { CalculatorForm } from './calculator-form'
import { Results } from './results'
import type { BenchState } from './use-bench'

interface BenchProps {
  bench: BenchState
  /** Keeps the pad of a phone down until a row is chosen. */
  padDown?: boolean
  children?: ReactNode
}

/** Measures on the left, the drawing on its plate, the numbers under it. On a phone the answer comes first. */
export function Bench({ bench, padDown = false, children }: BenchProps) {
  const { calculator, draw, raw, set, answer, stale, waiting, faults, preferences, asked, precision, cautions } = bench
  const marks = { faults, notes: stale ? [] : (answer?.warnings ?? []), cautions }
  const loose = faults.filter(({ field }) => calculator.inputs[field.split(/[.[]/)[0] ?? ''] === undefined)
  const remarks = stale ? [] : (answer?.warnings ?? []).filter(({ field }) => field === undefined)
  return (
    <section className="bench" aria-label={calculator.name}>
      <CalculatorForm calculator={calculator} raw={raw} set={set} marks={marks} precision={asked} padDown={padDown}>
        {loose.map(({ message }) => (
          <p key={message} className="field-fault" role="alert">
            {message}
          </p>
        ))}
        {children}
      </CalculatorForm>
      {answer && draw && (
        <BenchPlate
          draw={draw}
          answer={answer}
          precision={precision}
          metric={preferences.units === 'mm'}
          stale={stale}
          title={calculator.name}
        />
      )}
      {answer ? (
        <Results {...{ calculator, answer, stale, precision, preferences, cautions }} />
      ) : (
        <p className="results results-none">
          {waiting ? 'Working it out…' : 'Give the measures, and the numbers come here.'}
        </p>
      )}
      {remarks.length > 0 && (
        <ul className="remarks">
          {remarks.map(({ message }) => (
            <li key={message}>{message}</li>
          ))}
        </ul>
      )}
    </section>
  )
}
