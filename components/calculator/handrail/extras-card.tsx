'use client'

import { Panel } from '../../ui/panel'
import { ExtraSetsLater } from './later-drawings'
import { extraNames } from './measure'
import { useFieldSheet } from './sheet-context'

/** What is not of the stair itself: folded until it is wanted, or until something in it is off. */
export function ExtrasCard() {
  const { faults } = useFieldSheet()
  const off = faults.some(({ field }) => extraNames.some((name) => field === name || field.startsWith(`${name}.`)))
  return (
    <Panel className="sheet-card px-5 py-2 max-sm:px-4">
      <details className="sheet-extras" open={off || undefined}>
        <summary>Brackets, stock, filler, code rows, volutes</summary>
        <ExtraSetsLater />
      </details>
    </Panel>
  )
}
