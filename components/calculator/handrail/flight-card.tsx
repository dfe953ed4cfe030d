'use client'

import type { Closing } from '@/lib/trade/rail/types'
import { Button } from '../../ui/button'
import { ChoiceField } from '../../ui/choice-field'
import { ClosingWord } from './closing-word'
import { flightKeys } from './measure-keys'
import { removeFlight } from './measure-edits'
import { withText, type Way } from './measure'
import { Measured } from './measured'
import { CautionsBeside, SheetCard } from './sheet-card'
import { useFieldSheet } from './sheet-context'

const ways: readonly { value: Way; name: string }[] = [
  { value: 'tape', name: 'By tape' },
  { value: 'rake', name: 'Rake and pitch' },
  { value: 'count', name: 'Count risers' },
]
const wayHints: Readonly<Record<Way, string>> = {
  tape: 'Bottom nosing to top nosing: plumb, level, and if you can along the slope.',
  rake: 'Along the slope by tape, the slope by angle finder.',
  count: 'Every riser alike; the nosings follow from one.',
}
const optional = new Set(['nosingRake', 'firstRise', 'run'])

interface FlightCardProps {
  index: number
  mark?: string
  closing?: Closing
}

/** One flight, measured in one of three ways. */
export function FlightCard({ index, mark, closing }: FlightCardProps) {
  const { measure, store } = useFieldSheet()
  const way = measure.flights[index]?.way ?? 'tape'
  const path = `flights[${index}]`
  const remove = () =>
    store.replace(
      removeFlight(measure, index),
      `Flight ${index + 1} and the landing ${index === 0 ? 'above' : 'below'} it are gone.`,
    )
  return (
    <SheetCard
      title={`Flight ${index + 1}`}
      mark={mark}
      act={
        measure.flights.length > 1 && (
          <Button variant="quiet" onClick={remove} aria-label={`Remove flight ${index + 1}`}>
            Remove
          </Button>
        )
      }
    >
      <ChoiceField
        label="Measured"
        options={ways}
        value={way}
        onChange={(chosen) => store.type((now) => withText(now, `${path}.way`, chosen))}
        hint={wayHints[way]}
      />
      <div className="measure-pair">
        {flightKeys[way].map((key) => (
          <Measured key={key} path={`${path}.${key}`} optional={optional.has(key) && way !== 'count'} />
        ))}
      </div>
      {closing && <ClosingWord closing={closing} />}
      {index === 0 && <CautionsBeside name="flights" />}
    </SheetCard>
  )
}
