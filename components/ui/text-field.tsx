import type { ComponentPropsWithRef } from 'react'

import { classNames } from './class-names'
import { Field } from './field'
import { controlProps, type FieldProps } from './field-props'

type TextFieldProps = FieldProps & Omit<ComponentPropsWithRef<'input'>, keyof FieldProps | 'size'>

export const TextField = ({
  id,
  name,
  label,
  hint,
  error,
  optional,
  className,
  ...input
}: TextFieldProps) => {
  const field = { id, name, label, hint, error, optional }
  return (
    <Field {...field}>
      <input type="text" {...input} {...controlProps(field)} className={classNames('entry', className)} />
    </Field>
  )
}
