'use client'

import { useId, type ReactNode } from 'react'
import { CautionWord } from '../../ui/caution-word'
import { Panel } from '../../ui/panel'
import { usePartLight } from './lit'
import { useFieldSheet } from './sheet-context'

interface SheetCardProps {
  title: string
  /** The part of the rail that comes of this piece of the stair. */
  mark?: string
  act?: ReactNode
  children?: ReactNode
}

/** One piece of the stair on the field sheet, in climbing order. */
export function SheetCard({ title, mark, act, children }: SheetCardProps) {
  const id = useId()
  const light = usePartLight(mark)
  return (
    <Panel className="sheet-card px-5 pt-3 pb-1 max-sm:px-4" aria-labelledby={id} {...light}>
      <header className="sheet-card-head">
        <h2 id={id}>{title}</h2>
        {mark && (
          <span className="sheet-card-part">
            part <b>{mark}</b>
          </span>
        )}
        {act}
      </header>
      {children}
    </Panel>
  )
}

/** Cautions of the entry that belong beside one of its inputs. */
export function CautionsBeside({ name }: { name: string }) {
  const { cautions } = useFieldSheet()
  return cautions
    .filter(({ beside }) => beside === name)
    .map(({ signal, text }) => (
      <p key={text} className="sheet-caution">
        <CautionWord signal={signal} /> {text}
      </p>
    ))
}
