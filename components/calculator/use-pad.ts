'use client'

import { useState } from 'react'

export interface PadState {
  /** Name of the row that the pad writes into. */
  active: string | undefined
  /** False until a row is chosen where the first input is no number. */
  open: boolean
  /** The reader asked for the device's own keyboard. */
  keyboard: boolean
  activate: (name: string) => void
  /** Changes the row's text; `fresh` until the first change after it was chosen. */
  edit: (change: (text: string, fresh: boolean) => string) => void
  askKeyboard: () => void
}

interface PadRows {
  /** The pad stands ready before a row is chosen. */
  ready: boolean
  names: readonly string[]
  textOf: (name: string) => string
  write: (name: string, text: string) => void
}

/** Which row the pad writes into, and what its keys do there. The first key in a freshly chosen row starts over. */
export function usePad({ ready, names, textOf, write }: PadRows): PadState {
  const [chosen, setChosen] = useState<string | undefined>(undefined)
  const [fresh, setFresh] = useState(true)
  const [keyboard, setKeyboard] = useState(false)
  const active = chosen !== undefined && names.includes(chosen) ? chosen : names[0]
  return {
    active,
    open: ready || chosen !== undefined,
    keyboard,
    activate: (name) => {
      setFresh(name !== active || chosen === undefined)
      setChosen(name)
    },
    edit: (change) => {
      if (active === undefined) return
      write(active, change(textOf(active), fresh))
      setFresh(false)
    },
    askKeyboard: () => setKeyboard(true),
  }
}
