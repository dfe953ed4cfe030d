'use client'

import { ChoiceField } from '../../ui/choice-field'
import { fieldAt } from './fields-at'
import { hasOneSize, withText } from './measure'
import { Measured } from './measured'
import { SheetCard } from './sheet-card'
import { useFieldSheet } from './sheet-context'

/** What the rail is made of, how high it stands, and on which side. */
export function RailCard() {
  const { measure, store } = useFieldSheet()
  const hand = fieldAt(measure, 'hand')
  return (
    <SheetCard title="The rail">
      <ChoiceField
        label={hand?.label ?? 'Hand'}
        options={[
          { value: 'L', name: 'L, left' },
          { value: 'R', name: 'R, right' },
        ]}
        value={measure.hand}
        onChange={(text) => store.type((now) => withText(now, 'hand', text))}
        hint={hand?.hint}
      />
      <Measured path="railHeight" />
      <Measured path="section.shape" />
      <div className="measure-pair">
        <Measured path="section.depth" />
        {!hasOneSize(measure) && <Measured path="section.width" />}
      </div>
    </SheetCard>
  )
}
