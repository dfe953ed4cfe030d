'use client'

import { ChoiceField } from '../../ui/choice-field'
import { BracketPlaces } from './bracket-places'
import { placeOf } from './fields-at'
import { extraNames, withText, type ExtraName } from './measure'
import { turnExtra } from './measure-edits'
import { plainExtraKeys } from './measure-keys'
import { Measured } from './measured'
import { CautionsBeside } from './sheet-card'
import { useFieldSheet } from './sheet-context'

const extras: Readonly<Record<ExtraName, string>> = {
  brackets: 'Brackets',
  stock: 'Stock',
  weld: 'Filler and time',
  code: 'Code rows',
  volutes: 'Volutes',
}

/** Every extra with its switch, and its measures where it is on. */
export function ExtraSets() {
  return extraNames.map((name) => <ExtraSet key={name} name={name} />)
}

function ExtraSet({ name }: { name: ExtraName }) {
  const { measure, store } = useFieldSheet()
  const on = measure[name].on === 'yes'
  const turn = () => store.type((now) => turnExtra(now, name))
  return (
    <fieldset className="extra-set">
      <legend className="sr-only">{placeOf(name)}</legend>
      <label className="extra-switch">
        <input type="checkbox" checked={on} onChange={turn} />
        <span>{extras[name]}</span>
      </label>
      {on && (name === 'brackets' ? <BracketMeasures /> : <PlainMeasures name={name} />)}
      {on && <CautionsBeside name={name === 'code' ? 'checks' : name} />}
    </fieldset>
  )
}

const PlainMeasures = ({ name }: { name: Exclude<ExtraName, 'brackets'> }) => (
  <div className="measure-pair">
    {plainExtraKeys[name].map((key) => (
      <Measured key={key} path={`${name}.${key}`} />
    ))}
  </div>
)

function BracketMeasures() {
  const { measure, store } = useFieldSheet()
  const field = measure.brackets.way === 'field'
  return (
    <>
      <ChoiceField
        label="Set out"
        options={[
          { value: 'spaced', name: 'Evenly' },
          { value: 'field', name: 'Where taped' },
        ]}
        value={field ? 'field' : 'spaced'}
        onChange={(way) => store.type((now) => withText(now, 'brackets.way', way))}
      />
      {field && <BracketPlaces />}
      <div className="measure-pair">
        {(field ? ['jointClear'] : ['endDistance', 'maxSpacing']).map((key) => (
          <Measured key={key} path={`brackets.${key}`} />
        ))}
      </div>
    </>
  )
}
