import { useId, type ReactNode } from 'react'

export interface ChoiceFieldProps<T extends string | number> {
  label: string
  options: readonly { value: T; name: string }[]
  value: T | undefined
  onChange: (value: T) => void
  hint?: ReactNode
  fault?: string
}

/** A row of native radios that looks like one control. */
export function ChoiceField<T extends string | number>({
  label,
  options,
  value,
  onChange,
  hint,
  fault,
}: ChoiceFieldProps<T>) {
  const id = useId()
  return (
    <fieldset className="field choice" aria-describedby={fault ? `${id}-fault` : undefined}>
      <legend className="field-label">{label}</legend>
      <div className="choice-row">
        {options.map((option) => (
          <label key={option.value} className="choice-option">
            <input
              type="radio"
              name={id}
              value={option.value}
              checked={option.value === value}
              onChange={() => onChange(option.value)}
            />
            <span>{option.name}</span>
          </label>
        ))}
      </div>
      {fault && (
        <p id={`${id}-fault`} className="field-fault">
          {fault}
        </p>
      )}
      {hint && <p className="field-hint">{hint}</p>}
    </fieldset>
  )
}
