'use client'

import { TextField } from '../../ui/text-field'
import { withText } from './measure'
import { boxId } from './measured'
import { useFieldSheet } from './sheet-context'

const path = 'brackets.field'

/** Places of the brackets as they were taped on the stair, in one line. */
export function BracketPlaces() {
  const { measure, store, faults, notes } = useFieldSheet()
  const of = (field: string | undefined) => field === path || field?.startsWith(`${path}[`)
  const said = faults.filter(({ field }) => of(field)).map(({ message }) => message)
  return (
    <TextField
      id={boxId(path)}
      label="Bracket places, level from the bottom nosing"
      numeric
      value={measure.brackets.field ?? ''}
      onChange={({ target }) => store.type((now) => withText(now, path, target.value))}
      unit="in"
      autoComplete="off"
      spellCheck={false}
      fault={said[0]}
      hint={
        <>
          Parted by semicolons, + uphill: <span className="font-mono">6; 40 1/2; 75</span>
          {notes
            .filter(({ field }) => of(field))
            .map(({ message }) => (
              <span key={message} className="field-note">
                {message}
              </span>
            ))}
        </>
      }
    />
  )
}
