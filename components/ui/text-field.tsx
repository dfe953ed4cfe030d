import { useId, type ComponentProps, type ReactNode } from 'react'
import { classNames } from './class-names'

export interface TextFieldProps extends Omit<ComponentProps<'input'>, 'children'> {
  label: string
  hint?: ReactNode
  /** One sentence: what is off, and what would be accepted. */
  fault?: string
  /** Stands at the right end of the box. */
  unit?: string
  /** 24 px mono, as for every number a hand will use. */
  numeric?: boolean
}

/** Label, box and message, wired together for readers of every kind. */
export function TextField({ label, hint, fault, unit, numeric, className, id, ...rest }: TextFieldProps) {
  const own = useId()
  const fieldId = id ?? own
  const described = [fault ? `${fieldId}-fault` : '', hint ? `${fieldId}-hint` : ''].filter(Boolean).join(' ')
  return (
    <div className={classNames('field', className)}>
      <label htmlFor={fieldId} className="field-label">
        {label}
      </label>
      <div className={classNames('field-box', fault !== undefined && 'field-box-off')}>
        <input
          id={fieldId}
          className={classNames('field-input', numeric && 'font-mono text-2xl font-semibold')}
          aria-describedby={described || undefined}
          aria-invalid={fault !== undefined || undefined}
          {...rest}
        />
        {unit && <span className="field-unit">{unit}</span>}
      </div>
      {fault && (
        <p id={`${fieldId}-fault`} className="field-fault">
          {fault}
        </p>
      )}
      {hint && (
        <p id={`${fieldId}-hint`} className="field-hint">
          {hint}
        </p>
      )}
    </div>
  )
}
