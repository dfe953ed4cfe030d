'use client'

import type { RefObject } from 'react'
import type { Precision } from '@/lib/calculators/fields'
import { readQuantity } from '@/lib/trade/quantity/read'
import type { NumberField } from './field-kinds'
import { FractionStrip } from './fraction-strip'
import { Pad } from './pad'
import { pressKey, setFraction } from './pad-text'
import type { PadState } from './use-pad'

interface PadDockProps {
  pad: PadState
  field: NumberField | undefined
  text: string
  precision: Precision
  /** The form whose boxes Next walks through. */
  form: RefObject<HTMLElement | null>
}

/** Divisions that fractions of this field are read in; none where it has no fractions. */
function divisionsOf(field: NumberField | undefined, { tape, dial }: Precision): number {
  if (!field || field.kind === 'whole') return 0
  if (field.unit === 'deg') return 1 / dial
  return field.unit === 'in' || field.unit === 'in/ft' || field.unit === 'in/12' ? tape : 0
}

function partOf(text: string, field: NumberField | undefined): number | null {
  if (!field || text.trim() === '') return null
  const read = readQuantity(text, field.unit)
  if ('misread' in read) return null
  const size = Math.abs(read.value)
  return size - Math.floor(size)
}

function boxes(form: HTMLElement | null): HTMLInputElement[] {
  return [...(form?.querySelectorAll<HTMLInputElement>('input[data-pad]') ?? [])].filter(
    (box) => box.offsetParent !== null,
  )
}

/** Strip and pad at the foot of a phone. */
export function PadDock({ pad, field, text, precision, form }: PadDockProps) {
  const den = divisionsOf(field, precision)
  const boxNow = () => boxes(form.current).find((box) => box.name === pad.active)
  const next = () => {
    const all = boxes(form.current)
    const at = all.findIndex((box) => box.name === pad.active)
    const box = all[(at + 1) % all.length]
    box?.focus({ preventScroll: true })
  }
  const keyboard = () => {
    pad.askKeyboard()
    const box = boxNow()
    // A box that has the focus already brings no keyboard: it is given anew.
    box?.blur()
    requestAnimationFrame(() => box?.focus())
  }
  return (
    <div className="pad-dock no-print">
      {den > 1 ? (
        <FractionStrip
          den={den}
          part={partOf(text, field)}
          onPick={(divisions) => pad.edit((now) => setFraction(now, divisions, den))}
          label={`Fraction of ${field?.label ?? 'the measure'}`}
        />
      ) : (
        <div className="strip strip-none" aria-hidden="true" />
      )}
      <Pad onKey={(key) => pad.edit((now, fresh) => pressKey(now, key, fresh))} onNext={next} onKeyboard={keyboard} />
    </div>
  )
}
