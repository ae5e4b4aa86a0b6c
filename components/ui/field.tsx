import type { ReactNode } from 'react'

import { FieldError } from './field-error'
import type { FieldProps } from './field-props'

type Props = FieldProps & {
  /** The control, already carrying `controlProps(...)`. */
  readonly children: ReactNode
}

/** A label, its hint, the control and the error below it. */
export const Field = ({ id, name, label, hint, error, optional, children }: Props) => {
  const controlId = id ?? name
  return (
    <div className="field">
      <label htmlFor={controlId} className="text-sm font-semibold">
        {label}
        {optional ? <span className="font-normal text-ink-faint"> (optional)</span> : null}
      </label>
      {hint ? (
        <p id={`${controlId}-hint`} className="field-hint text-sm text-ink-soft">
          {hint}
        </p>
      ) : null}
      {children}
      {error ? <FieldError id={`${controlId}-error`}>{error}</FieldError> : null}
    </div>
  )
}
