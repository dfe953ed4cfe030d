'use client'

import { useRef } from 'react'
import { savePreferences } from '@/lib/queries/account'
import type { Preferences } from '@/lib/schemas/account'
import { Button } from './button'
import { ChoiceField } from './choice-field'
import { useMe } from './me'
import { keepPreferences } from './preferences-store'
import { usePreferences } from './use-preferences'

export { usePreferences }

const units = [
  { value: 'in', name: 'Feet and inches' },
  { value: 'mm', name: 'Millimetres' },
] as const
const tapes = [8, 16, 32, 64].map((value) => ({ value: value as Preferences['tape'], name: `1/${value}` }))
const dials = [
  { value: 0.25, name: '1/4°' },
  { value: 0.5, name: '1/2°' },
  { value: 1, name: '1°' },
] as const
const squares = [
  { value: 0, name: '0 is square' },
  { value: 90, name: '90 is square' },
] as const
const themes = [
  { value: 'system', name: 'As the device' },
  { value: 'paper', name: 'Paper' },
  { value: 'sun', name: 'Bright sun' },
  { value: 'night', name: 'Night' },
] as const

/** On the device at once; with the account too when signed in. A lost connection costs the account's copy only. */
function change(wanted: Partial<Preferences>, signedIn: boolean): void {
  keepPreferences(wanted)
  if (!signedIn) return
  savePreferences(wanted).catch(() => undefined)
}

/** The fields alone, for the dialog and for the account page. */
export function PreferencesFields() {
  const now = usePreferences()
  const signedIn = Boolean(useMe())
  const set = (wanted: Partial<Preferences>) => change(wanted, signedIn)
  return (
    <>
      <ChoiceField
        label="Lengths shown in"
        options={units}
        value={now.units}
        onChange={(value) => set({ units: value })}
      />
      <ChoiceField
        label="Finest mark on your tape"
        options={tapes}
        value={now.tape}
        onChange={(tape) => set({ tape })}
      />
      <ChoiceField
        label="Your saw says"
        options={squares}
        value={now.sawSquare}
        onChange={(sawSquare) => set({ sawSquare })}
      />
      <ChoiceField
        label="Finest step of the dial"
        options={dials}
        value={now.dialStep}
        onChange={(dialStep) => set({ dialStep })}
      />
      <ChoiceField label="Screen" options={themes} value={now.theme} onChange={(theme) => set({ theme })} />
    </>
  )
}

/** Opens the dialog of preferences; says the unit in use. */
export function PreferencesButton() {
  const dialog = useRef<HTMLDialogElement>(null)
  const { units: unit, tape } = usePreferences()
  return (
    <>
      <button
        type="button"
        className="nav-link cursor-pointer"
        onClick={() => dialog.current?.showModal()}
        aria-haspopup="dialog"
      >
        <span className="sr-only">Tape, saw and screen. Lengths in </span>
        {unit === 'in' ? `in · 1/${tape}` : 'mm'}
      </button>
      <dialog ref={dialog} className="sheet-dialog" aria-labelledby="preferences-title">
        <h2 id="preferences-title" className="mb-4 text-3xl">
          Tape, saw and screen
        </h2>
        <PreferencesFields />
        <form method="dialog" className="mt-2">
          <Button type="submit" variant="primary">
            Done
          </Button>
        </form>
      </dialog>
    </>
  )
}
