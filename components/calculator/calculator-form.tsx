'use client'

import { useRef, type ReactNode } from 'react'
import type { AnyCalculator } from '@/lib/calculators/define'
import type { Precision } from '@/lib/calculators/fields'
import type { RawInputs } from './address'
import { isNumber, splitFields, textOfRaw } from './field-kinds'
import type { Marks } from './field-marks'
import { InputField } from './input-field'
import { PadDock } from './pad-dock'
import { usePad } from './use-pad'
import { usePhone } from './use-phone'
import { useTypedEarly } from './use-typed-early'

interface CalculatorFormProps {
  calculator: AnyCalculator
  raw: RawInputs
  set: (change: RawInputs) => void
  marks: Marks
  precision: Precision
  padDown: boolean
  /** Buttons under the inputs. */
  children?: ReactNode
}

/** The inputs of an entry, in its own order; on a phone with strip and pad. */
export function CalculatorForm({ calculator, raw, set, marks, precision, padDown, children }: CalculatorFormProps) {
  const form = useRef<HTMLFormElement>(null)
  useTypedEarly(form, raw, set)
  const phone = usePhone()
  const { inputs, example } = calculator
  const { main, more } = splitFields(inputs, example)
  const [first] = main
  const pad = usePad({
    ready: !padDown && first !== undefined && isNumber(first[1]),
    names: Object.keys(inputs).filter((name) => inputs[name] && isNumber(inputs[name])),
    textOf: (name) => textOfRaw(raw[name]),
    write: (name, text) => set({ [name]: text }),
  })
  const shared = { raw, set, marks, pad, phone, precision }
  const active = pad.active === undefined ? undefined : inputs[pad.active]
  const opened = more.some(([name]) => raw[name] !== undefined && raw[name] !== '')
  return (
    <form ref={form} className="bench-inputs" aria-label="Measures" onSubmit={(event) => event.preventDefault()}>
      {main.map(([name, field]) => (
        <InputField key={name} name={name} field={field} {...shared} />
      ))}
      {more.length > 0 && (
        <details className="more" open={opened}>
          <summary>More to set</summary>
          {more.map(([name, field]) => (
            <InputField key={name} name={name} field={field} {...shared} />
          ))}
        </details>
      )}
      {children}
      {pad.open && (
        <PadDock
          pad={pad}
          field={active && isNumber(active) ? active : undefined}
          text={pad.active === undefined ? '' : textOfRaw(raw[pad.active])}
          precision={precision}
          form={form}
        />
      )}
    </form>
  )
}
