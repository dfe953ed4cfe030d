'use client'

import type { SheetHead } from '@/lib/print/sheet/sheet'
import { TextField } from '../ui/text-field'

const fields = [
  ['job', 'Job', 'As the shop calls it.', 120],
  ['sheet', 'Which rail', 'Front stoop, left side.', 80],
  ['measuredBy', 'Measured by', undefined, 80],
  ['measuredOn', 'On', undefined, 10],
  ['instrument', 'Measured with', 'Tape, plumb, angle finder.', 120],
] as const

interface HeadFieldsProps {
  head: SheetHead
  onChange: (head: SheetHead) => void
}

/** What stands at the head of a sheet that is kept nowhere; left empty, the paper has a blank to write on. */
export function HeadFields({ head, onChange }: HeadFieldsProps) {
  return (
    <details className="sheet-head-fields no-print">
      <summary>Job, name and date on the sheet</summary>
      <div className="sheet-head-grid">
        {fields.map(([name, label, hint, longest]) => (
          <TextField
            key={name}
            label={label}
            hint={hint}
            type={name === 'measuredOn' ? 'date' : 'text'}
            maxLength={longest}
            autoComplete="off"
            value={head[name]}
            onChange={({ target }) => onChange({ ...head, [name]: target.value })}
          />
        ))}
      </div>
    </details>
  )
}
