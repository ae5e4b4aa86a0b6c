import type { ComponentPropsWithRef } from 'react'

import { classNames } from './class-names'
import { Field } from './field'
import { controlProps, type FieldProps } from './field-props'

export type SelectOption = {
  readonly value: string
  readonly label: string
  readonly disabled?: boolean | undefined
}

type SelectFieldProps = FieldProps &
  Omit<ComponentPropsWithRef<'select'>, keyof FieldProps | 'children'> & {
    readonly options: readonly SelectOption[]
    /** Shown first with an empty value, e.g. "Choose a detector". */
    readonly placeholder?: string | undefined
  }

export const SelectField = ({
  id,
  name,
  label,
  hint,
  error,
  optional,
  options,
  placeholder,
  className,
  ...select
}: SelectFieldProps) => {
  const field = { id, name, label, hint, error, optional }
  return (
    <Field {...field}>
      <select {...select} {...controlProps(field)} className={classNames('entry', className)}>
        {placeholder === undefined ? null : <option value="">{placeholder}</option>}
        {options.map((option) => (
          <option key={option.value} value={option.value} disabled={option.disabled}>
            {option.label}
          </option>
        ))}
      </select>
    </Field>
  )
}
