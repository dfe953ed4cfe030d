'use client'

import type { ReactNode } from 'react'
import { TextField } from '../ui/text-field'
import type { NumberField } from './field-kinds'
import { unitWords } from './unit-words'

interface QuantityRowProps {
  id: string
  name: string
  field: NumberField
  value: string
  onChange: (text: string) => void
  /** True while the pad writes into this row. */
  active: boolean
  onActive: () => void
  /** False keeps the device's keyboard down: the pad is there. */
  keyboard: boolean
  placeholder?: string
  fault?: string
  below?: ReactNode
}

/** One measure to type: stacked on a desk, a row on a phone. */
export function QuantityRow({
  id,
  name,
  field,
  value,
  onChange,
  active,
  onActive,
  keyboard,
  placeholder,
  fault,
  below,
}: QuantityRowProps) {
  return (
    <div className="quantity-row" data-active={active || undefined}>
      <TextField
        id={id}
        label={field.label}
        name={name}
        numeric
        value={value}
        onChange={(event) => onChange(event.target.value)}
        onFocus={({ currentTarget }) => {
          onActive()
          // With the device's keyboard down nobody else moves the row out from under the pad.
          if (!keyboard) currentTarget.closest('.quantity-row')?.scrollIntoView({ block: 'nearest' })
        }}
        unit={unitWords[field.unit]}
        inputMode={keyboard ? undefined : 'none'}
        data-pad=""
        autoComplete="off"
        autoCorrect="off"
        spellCheck={false}
        enterKeyHint="next"
        placeholder={placeholder}
        fault={fault}
        hint={below}
      />
    </div>
  )
}
