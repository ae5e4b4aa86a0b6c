import type { ReactNode } from 'react'

import { FieldError } from './field-error'
import type { FieldProps } from './field-props'

export type Choice = { readonly value: string; readonly label: ReactNode; readonly hint?: ReactNode }

type ChoiceFieldProps = FieldProps & {
  readonly choices: readonly Choice[]
  readonly defaultValue?: string | undefined
}

/** One of a few, all in view: radio buttons in a fieldset. */
export const ChoiceField = ({ id, name, label, hint, error, choices, defaultValue }: ChoiceFieldProps) => {
  const groupId = id ?? name
  const described = [hint ? `${groupId}-hint` : '', error ? `${groupId}-error` : ''].filter(Boolean).join(' ')
  return (
    <fieldset id={groupId} tabIndex={-1} aria-describedby={described || undefined}>
      <legend className="text-sm font-semibold">{label}</legend>
      {hint ? (
        <p id={`${groupId}-hint`} className="text-sm text-ink-soft">
          {hint}
        </p>
      ) : null}
      <div className="mt-1.5 flex flex-col gap-2">
        {choices.map((choice) => (
          <label key={choice.value} className="flex min-h-6 items-start gap-2.5">
            <input
              type="radio"
              name={name}
              value={choice.value}
              defaultChecked={choice.value === defaultValue}
              className="mt-0.5 size-5 shrink-0 accent-copper"
            />
            <span>
              {choice.label}
              {choice.hint ? <span className="block text-sm text-ink-soft">{choice.hint}</span> : null}
            </span>
          </label>
        ))}
      </div>
      {error ? <FieldError id={`${groupId}-error`}>{error}</FieldError> : null}
    </fieldset>
  )
}
