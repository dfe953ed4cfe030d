import { useId, type ComponentProps } from 'react'

interface Props extends ComponentProps<'textarea'> {
  label: string
  fault?: string
}

/** Several lines of text, wired as the one-line field is. */
export function NotesField({ label, fault, ...rest }: Props) {
  const id = useId()
  return (
    <div className="field">
      <label htmlFor={id} className="field-label">
        {label}
      </label>
      <div className="field-box">
        <textarea
          id={id}
          rows={4}
          className="field-input"
          aria-invalid={fault !== undefined || undefined}
          aria-describedby={fault ? `${id}-fault` : undefined}
          {...rest}
        />
      </div>
      {fault && (
        <p id={`${id}-fault`} className="field-fault">
          {fault}
        </p>
      )}
    </div>
  )
}
