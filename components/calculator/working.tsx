'use client'

import { useState } from 'react'
import type { AnyCalculator, Step } from '@/lib/calculators/define'
import { Button } from '../ui/button'

/** Formula in math syntax to MathML. */
export type Typeset = Readonly<Record<string, string>>

interface WorkingProps {
  calculator: AnyCalculator
  steps: readonly Step[]
  stale: boolean
  /** Formulas set ahead by the server; of a branch that the example does not take there is only the text. */
  typeset: Typeset
}

/** How it works out: each formula, the same with these numbers, and what comes of it. */
export function Working({ calculator, steps, stale, typeset }: WorkingProps) {
  const [setFormula, setSetFormula] = useState<((formula: string) => string) | null>(null)
  const fetchTypesetter = async () => {
    const { typesetter } = await import('./typeset')
    setSetFormula(() => typesetter(calculator))
  }
  const numbers = steps.some(({ substituted }) => substituted !== undefined)
  return (
    <section aria-labelledby="working" className="working" data-stale={stale || undefined}>
      <h2 id="working">How it works out</h2>
      <ol>
        {steps.map((step, i) => (
          <li key={i}>
            <p>{step.says}</p>
            {step.formula && <Formula text={step.formula} html={typeset[step.formula] ?? setFormula?.(step.formula)} />}
            <Numbers step={step} html={step.substituted === undefined ? undefined : setFormula?.(step.substituted)} />
          </li>
        ))}
      </ol>
      {numbers && !setFormula && (
        <Button className="no-print" onClick={() => void fetchTypesetter()}>
          Set these numbers as formulas
        </Button>
      )}
    </section>
  )
}

/** Our own formula, set by our own typesetter: nothing a reader typed but numbers reaches it. A long one scrolls, by key too. */
const Formula = ({ text, html }: { text: string; html: string | undefined }) =>
  html === undefined ? (
    <p className="formula font-mono">{text}</p>
  ) : (
    <p className="formula" tabIndex={0} dangerouslySetInnerHTML={{ __html: html }} />
  )

function Numbers({ step, html }: { step: Step; html: string | undefined }) {
  if (step.substituted === undefined)
    return (
      <p className="substituted">
        <b>{step.value}</b>
      </p>
    )
  return (
    <p className="substituted">
      {html === undefined ? `= ${step.substituted}` : <span dangerouslySetInnerHTML={{ __html: `= ${html}` }} />} ={' '}
      <b>{step.value}</b>
    </p>
  )
}
