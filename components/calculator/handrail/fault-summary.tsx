'use client'

import type { MouseEvent } from 'react'
import { placeOf } from './fields-at'
import { boxId } from './measured'
import type { PlacedFault } from './placed-faults'

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

function countText(faults: readonly PlacedFault[], shown: boolean): string {
  const one = faults.length === 1
  const last = shown ? ' The rail shown is the last one that could be worked out.' : ''
  if (faults.every(({ missing }) => missing))
    return `${one ? 'One measure is' : `${faults.length} measures are`} still to come.${last}`
  return `${one ? 'One measure' : `${faults.length} measures`} to look at again.${last}`
}

/** What keeps the rail from being worked out, each a way to its box. The list does not move the sheet. */
export function FaultSummary({ faults, shown }: { faults: readonly PlacedFault[]; shown: boolean }) {
  if (faults.length === 0) return null
  return (
    <section
      className="fault-summary"
      aria-label="To mend"
      data-missing={faults.every(({ missing }) => missing) || undefined}
    >
      <p role="status">{countText(faults, shown)}</p>
      <ul>
        {faults.map(({ field, message }) => (
          <li key={`${field} ${message}`}>
            <a href={`#${boxId(field)}`} onClick={(event) => goTo(event, field)}>
              <b>{placeOf(field)}</b> <span>{message}</span>
            </a>
          </li>
        ))}
      </ul>
    </section>
  )
}
