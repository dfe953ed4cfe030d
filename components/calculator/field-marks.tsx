import type { ReactNode } from 'react'
import type { Fault } from '@/lib/calculators/read'
import type { Caution, Note, Values } from '@/lib/calculators/define'
import { CautionWord } from '../ui/caution-word'

/** What is said beside each input: faults of what is typed, notes on unusual values, cautions that stand. */
export interface Marks {
  faults: readonly Fault[]
  notes: readonly Note[]
  cautions: readonly Caution<Values, Values>[]
}

const isOf = (name: string, field: string | undefined) =>
  field === name || field?.startsWith(`${name}.`) === true || field?.startsWith(`${name}[`) === true

/** The sentence for a wrong input, or nothing. */
export const faultOf = (marks: Marks, name: string): string | undefined =>
  marks.faults.find(({ field }) => isOf(name, field))?.message

/** Notes and cautions of one input, to stand under it. */
export function FieldMarks({ marks, name }: { marks: Marks; name: string }): ReactNode {
  const notes = marks.notes.filter(({ field }) => isOf(name, field))
  const cautions = marks.cautions.filter(({ beside }) => beside === name)
  return (
    <>
      {notes.map(({ message }) => (
        <span key={message} className="field-note">
          {message}
        </span>
      ))}
      {cautions.map(({ signal, text }) => (
        <span key={text} className="field-note">
          <CautionWord signal={signal} /> {text}
        </span>
      ))}
    </>
  )
}
