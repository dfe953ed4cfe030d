'use client'

import type { Field, Precision } from '@/lib/calculators/fields'
import { ChoiceField } from '../ui/choice-field'
import type { RawInputs } from './address'
import { fallbackText, isNumber, optionsOf, textOfRaw } from './field-kinds'
import { FieldMarks, faultOf, type Marks } from './field-marks'
import { ListEditor } from './list-editor'
import { QuantityRow } from './quantity-row'
import type { PadState } from './use-pad'

interface InputFieldProps {
  name: string
  field: Field
  raw: RawInputs
  set: (change: RawInputs) => void
  marks: Marks
  pad: PadState
  phone: boolean
  precision: Precision
}

/** One input of an entry, by its kind. Nested sets belong to entries that bring a form of their own. */
export function InputField({ name, field, raw, set, marks, pad, phone, precision }: InputFieldProps) {
  const value = textOfRaw(raw[name])
  const fault = faultOf(marks, name)
  const below = (
    <>
      {field.hint && <span className="field-hint-text">{field.hint}</span>}
      <FieldMarks marks={marks} name={name} />
    </>
  )
  if (isNumber(field)) {
    return (
      <QuantityRow
        id={`input-${name}`}
        name={name}
        field={field}
        value={value}
        onChange={(text) => set({ [name]: text })}
        active={phone && pad.active === name}
        onActive={() => pad.activate(name)}
        keyboard={!phone || pad.keyboard}
        placeholder={fallbackText(field, precision)}
        fault={fault}
        below={below}
      />
    )
  }
  if (field.kind === 'choice') {
    return (
      <ChoiceField
        label={field.label}
        options={optionsOf(field)}
        value={value === '' ? fallbackText(field, precision) : value}
        onChange={(option) => set({ [name]: option })}
        fault={fault}
        hint={below}
      />
    )
  }
  if (field.kind === 'list')
    return (
      <ListEditor
        name={name}
        field={field}
        value={raw[name]}
        onChange={(items) => set({ [name]: items })}
        faults={marks.faults}
      />
    )
  return null
}
