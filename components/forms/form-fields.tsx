'use client'

import type { ComponentType } from 'react'

import { CheckboxField } from '../ui/checkbox-field'
import { QuantityField } from '../ui/quantity-field'
import { SelectField } from '../ui/select-field'
import { TextArea } from '../ui/text-area'
import { TextField } from '../ui/text-field'
import { useFieldError } from './form-state'

type Named = { readonly name: string; readonly error?: string | undefined }

/** A field that shows what the last submission of the form around it said about it. */
function withFormError<Props extends Named>(Field: ComponentType<Props>): ComponentType<Props> {
  const FieldOfForm = (props: Props) => {
    const error = useFieldError(props.name)
    return <Field {...props} error={props.error ?? error} />
  }
  return FieldOfForm
}

export const FormText = withFormError(TextField)
export const FormArea = withFormError(TextArea)
export const FormSelect = withFormError(SelectField)
export const FormQuantity = withFormError(QuantityField)
export const FormCheckbox = withFormError(CheckboxField)
