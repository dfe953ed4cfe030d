'use client'

import { fallbackText, isNumber, optionsOf } from '../field-kinds'
import { ChoiceField } from '../../ui/choice-field'
import { QuantityRow } from '../quantity-row'
import { fieldAt, inSheetWords } from './fields-at'
import { textAt, withText } from './measure'
import { useFieldSheet } from './sheet-context'

/** Id of the box at a path. */
export const boxId = (path: string) => `input-${path}`

interface MeasuredProps {
  path: string
  /** Stands in for the entry's label where the card says the rest. */
  label?: string
  /** Need not be given. */
  optional?: boolean
}

/** One measure of the field sheet, with all that is said of it. */
export function Measured({ path, label, optional = false }: MeasuredProps) {
  const { measure, store, faults, notes, pad, phone, precision } = useFieldSheet()
  const field = fieldAt(measure, path)
  if (!field) return null
  const value = textAt(measure, path)
  const off = faults.find((one) => one.field === path)
  const remarks = notes.filter((note) => note.field === path).map(({ message }) => inSheetWords(measure, path, message))
  // An empty box is not wrong yet: it says what it needs, but not in red.
  const missing = off?.missing ? off.message : undefined
  const fault = off?.missing ? undefined : off?.message
  const write = (text: string) => store.type((now) => withText(now, path, text))
  if (field.kind === 'choice')
    return (
      <ChoiceField
        label={label ?? field.label}
        options={optionsOf(field)}
        value={value}
        onChange={write}
        fault={fault}
        hint={field.hint}
      />
    )
  if (!isNumber(field)) return null
  return (
    <QuantityRow
      id={boxId(path)}
      name={path}
      field={field}
      value={value}
      onChange={write}
      active={phone && pad.open && pad.active === path}
      onActive={() => pad.activate(path)}
      keyboard={!phone || pad.keyboard}
      placeholder={fallbackText(field, precision) ?? (optional ? 'if taped' : undefined)}
      fault={fault}
      below={
        (field.hint || missing || remarks.length > 0) && (
          <>
            {missing && <span className="field-note field-needed">{missing}</span>}
            {field.hint && <span className="field-hint-text">{field.hint}</span>}
            {remarks.map((message) => (
              <span key={message} className="field-note">
                {message}
              </span>
            ))}
          </>
        )
      }
    />
  )
}
