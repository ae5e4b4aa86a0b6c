import type { ComponentPropsWithRef } from 'react'

import { classNames } from './class-names'
import { Field } from './field'
import { controlProps, type FieldProps } from './field-props'

type QuantityFieldProps = FieldProps &
  Omit<ComponentPropsWithRef<'input'>, keyof FieldProps | 'type' | 'inputMode'> & {
    /** The SI unit that a bare number is taken in, e.g. "F"; empty for a pure number. */
    readonly unit: string
  }

/** The lighter unit inside the frame is for the eye; the label and the description carry it for everybody else. */
export const QuantityField = ({
  id,
  name,
  label,
  hint = 'For example 4n7, 2.2 nF or 500k.',
  error,
  optional,
  unit,
  className,
  ...input
}: QuantityFieldProps) => {
  const field = { id, name, label, hint, error, optional }
  const control = controlProps(field)
  const unitId = `${control.id}-unit`
  return (
    <Field {...field}>
      <span className="entry-frame relative block">
        <input
          type="text"
          inputMode="text"
          autoComplete="off"
          autoCapitalize="none"
          spellCheck={false}
          {...input}
          {...control}
          aria-describedby={classNames(unit && unitId, control['aria-describedby']) || undefined}
          className={classNames('num entry text-right', unit && 'pr-16', className)}
        />
        {unit ? (
          <span
            aria-hidden="true"
            className="unit pointer-events-none absolute left-[calc(100%-3.625rem)] top-[0.5rem]"
          >
            {unit}
          </span>
        ) : null}
        {unit ? <span id={unitId} hidden>{`in ${unit}`}</span> : null}
      </span>
    </Field>
  )
}
