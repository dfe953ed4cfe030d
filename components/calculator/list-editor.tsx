'use client'

import { useId, useState } from 'react'
import type { ListField } from '@/lib/calculators/fields'
import type { Fault } from '@/lib/calculators/read'
import { textOfRaw } from './field-kinds'
import { lineOfItem, readList, writeList } from './list-text'

interface ListEditorProps {
  name: string
  field: ListField
  value: unknown
  onChange: (items: string[]) => void
  faults: readonly Fault[]
}

const itemsOf = (value: unknown): string[] => (Array.isArray(value) ? value.map(textOfRaw) : [])

/** Many measures at once, one a line; paste as many as there are. */
export function ListEditor({ name, field, value, onChange, faults }: ListEditorProps) {
  const id = useId()
  const items = itemsOf(value)
  const [typed, setTyped] = useState(() => writeList(items))
  // The typed lines stand as long as they mean the list; numbers from elsewhere (a link, Back) replace them.
  const text = readList(typed).join(';') === items.join(';') ? typed : writeList(items)
  const own = faults.filter((fault) => fault.field === name || fault.field.startsWith(`${name}[`))
  return (
    <div className="field">
      <label htmlFor={id} className="field-label">
        {field.label}
      </label>
      <div className={own.length > 0 ? 'field-box field-box-off' : 'field-box'}>
        <textarea
          id={id}
          className="field-input min-h-44 font-mono text-[21px] font-semibold"
          rows={Math.min(12, Math.max(5, text.split('\n').length + 1))}
          value={text}
          spellCheck={false}
          aria-invalid={own.length > 0 || undefined}
          aria-describedby={`${id}-says`}
          onChange={(event) => {
            setTyped(event.target.value)
            onChange(readList(event.target.value))
          }}
        />
      </div>
      <div id={`${id}-says`}>
        {own.slice(0, 3).map((fault) => (
          <p key={fault.field} className="field-fault">
            {placeOf(fault, text)}
            {fault.message}
          </p>
        ))}
        <p className="field-hint">
          {items.length} in all. One a line; <span className="font-mono">3 × 74 1/2</span> for three alike. Paste as
          many as you have.
        </p>
      </div>
    </div>
  )
}

function placeOf({ field }: Fault, text: string): string {
  const [, index] = /\[(\d+)\]/.exec(field) ?? []
  return index === undefined ? '' : `Line ${lineOfItem(text, Number(index))}. `
}
