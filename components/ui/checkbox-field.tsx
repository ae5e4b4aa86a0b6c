import type { ComponentPropsWithRef } from 'react'

import { FieldError } from './field-error'
import { controlProps, type FieldProps } from './field-props'

type CheckboxFieldProps = FieldProps & Omit<ComponentPropsWithRef<'input'>, keyof FieldProps | 'type'>

export const CheckboxField = ({ id, name, label, hint, error, optional, ...input }: CheckboxFieldProps) => {
  const control = controlProps({ id, name, label, hint, error, optional })
  return (
    <div className="flex flex-col gap-1">
      <label htmlFor={control.id} className="flex min-h-6 items-start gap-2.5">
        <input type="checkbox" {...input} {...control} className="mt-0.5 size-5 shrink-0 accent-copper" />
        <span>{label}</span>
      </label>
      {hint ? (
        <p id={`${control.id}-hint`} className="pl-7.5 text-sm text-ink-soft">
          {hint}
        </p>
      ) : null}
      {error ? <FieldError id={`${control.id}-error`}>{error}</FieldError> : null}
    </div>
  )
}
