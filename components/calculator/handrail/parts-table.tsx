'use client'

import type { RailPart, Section } from '@/lib/trade/rail/types'
import { sectionText, slopeText } from '@/lib/trade/rail/words'
import { EndCut } from './end-cut'
import { LengthCell } from './length-cell'
import { PartMark, usePartLight } from './lit'
import type { Reading } from './reading-of'

const heads = ['Part', 'Top edge', 'Underside', 'Blank, tip to tip', 'Low end', 'High end', 'Between cuts'] as const

interface PartsTableProps {
  parts: readonly RailPart[]
  section: Section
  reading: Reading
}

/** Every part in cutting order, as the cut sheet has it. On narrow screens each row is a card. */
export function PartsTable({ parts, section, reading }: PartsTableProps) {
  const { precision, preferences } = reading
  return (
    <section aria-labelledby="parts" className="rail-parts">
      <h2 id="parts">Parts to cut</h2>
      <p className="rail-says">
        All of {sectionText(section, precision.tape)}. The saw reads {preferences.sawSquare} when it cuts square. Both
        edges are measured on the same face; low and high end as the part lies on the stair.
      </p>
      <table role="table" className="parts-table">
        <thead role="rowgroup">
          <tr role="row">
            {heads.map((head) => (
              <th key={head} role="columnheader" scope="col">
                {head}
              </th>
            ))}
          </tr>
        </thead>
        <tbody role="rowgroup">
          {parts.map((part) => (
            <PartRow key={part.mark} part={part} reading={reading} />
          ))}
        </tbody>
      </table>
    </section>
  )
}

function PartRow({ part, reading }: { part: RailPart; reading: Reading }) {
  const light = usePartLight(part.mark)
  const shared = { step: reading.precision.dial, preferences: reading.preferences }
  return (
    <tr role="row" {...light}>
      <th role="rowheader" scope="row">
        <PartMark mark={part.mark} />
        <small>
          {part.kind}, {slopeText(part.slope)}
        </small>
      </th>
      <td role="cell" data-head="Top edge">
        <LengthCell inches={part.topEdge} reading={reading} />
      </td>
      <td role="cell" data-head="Underside">
        <LengthCell inches={part.underside} reading={reading} />
      </td>
      <td role="cell" data-head="Blank, tip to tip">
        <LengthCell inches={part.overall} reading={reading} />
      </td>
      <td role="cell" data-head="Low end">
        <EndCut end={part.endA} {...shared} />
      </td>
      <td role="cell" data-head="High end">
        <EndCut end={part.endB} {...shared} />
      </td>
      <td role="cell" data-head="Between cuts" className="cut-between">
        <span>{part.cuts}</span>
        {part.turn && <b>{part.turn}</b>}
        {part.note && <small>{part.note}</small>}
      </td>
    </tr>
  )
}
