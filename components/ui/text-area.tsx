import type { ComponentPropsWithRef } from 'react'

import { classNames } from './class-names'
import { Field } from './field'
import { controlProps, type FieldProps } from './field-props'

type TextAreaProps = FieldProps & Omit<ComponentPropsWithRef<'textarea'>, keyof FieldProps>

export const TextArea = ({ id, name, label, hint, error, optional, className, ...area }: TextAreaProps) => {
  const field = { id, name, label, hint, error, optional }
  return (
    <Field {...field}>
      <textarea rows={5} {...area} {...controlProps(field)} className={classNames('entry', className)} />
    </Field>
  )
}
