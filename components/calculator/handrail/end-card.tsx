'use client'

import { ChoiceField } from '../../ui/choice-field'
import { withText } from './measure'
import { endAsks } from './measure-keys'
import { Measured } from './measured'
import { SheetCard } from './sheet-card'
import { useFieldSheet } from './sheet-context'

const optional = new Set(['railHeight'])

/** Where the rail ends, and whether it turns to the wall there. */
export function EndCard({ end, mark }: { end: 'bottom' | 'top'; mark?: string }) {
  const { measure, store } = useFieldSheet()
  const texts = measure[end]
  return (
    <SheetCard title={end === 'bottom' ? 'Bottom end' : 'Top end'} mark={mark}>
      <Measured path={`${end}.type`} label="How it ends" />
      {endAsks(end, texts.type).map((key) => (
        <Measured key={key} path={`${end}.${key}`} optional={optional.has(key)} />
      ))}
      <ChoiceField
        label="Return to the wall"
        options={[
          { value: '', name: 'No return' },
          { value: 'yes', name: 'Returns' },
        ]}
        value={texts.return.on ?? ''}
        onChange={(on) => store.type((now) => withText(now, `${end}.return.on`, on))}
      />
      {texts.return.on === 'yes' && (
        <div className="measure-pair">
          <Measured path={`${end}.return.clearance`} />
          <Measured path={`${end}.return.gap`} />
        </div>
      )}
    </SheetCard>
  )
}
