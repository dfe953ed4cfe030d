'use client'

import type { MouseEvent } from 'react'
import type { Fault } from '@/lib/calculators/read'
import { placeOf } from './fields-at'
import { boxId } from './measured'

/** The box that a fault is about: of a list, the one that holds it. */
const boxOf = (field: string) =>
  document.getElementById(boxId(field)) ?? document.getElementById(boxId(field.replace(/\[\d+\]$/, '')))

function goTo(event: MouseEvent, field: string): void {
  event.preventDefault()
  const box = boxOf(field)
  const fold = box?.closest('details')
  if (fold) fold.open = true
  box?.focus()
}

/** What keeps the rail from being worked out, each a way to its box. The list does not move the sheet. */
export function FaultSummary({ faults, shown }: { faults: readonly Fault[]; shown: boolean }) {
  if (faults.length === 0) return null
  return (
    <section className="fault-summary" role="status" aria-label="To mend">
      <p>
        {faults.length === 1 ? 'One measure is' : `${faults.length} measures are`} missing or cannot be read.
        {shown && ' The rail shown is the last one that could be worked out.'}
      </p>
      <ul>
        {faults.map(({ field, message }) => (
          <li key={`${field} ${message}`}>
            <a href={`#${boxId(field)}`} onClick={(event) => goTo(event, field)}>
              <b>{placeOf(field)}</b> {message}
            </a>
          </li>
        ))}
      </ul>
    </section>
  )
}
