import type { ReactNode } from 'react'

/** What every field takes: the words around the control. `error` set means the control is marked invalid. */
export type FieldProps = {
  readonly name: string
  readonly label: ReactNode
  /** Defaults to `name`; give it when two forms of one page use the same name. */
  readonly id?: string | undefined
  readonly hint?: ReactNode
  readonly error?: string | undefined
  /** Written after the label of a field that may stay empty. */
  readonly optional?: boolean | undefined
}

/** The ARIA wiring between a control, its hint and its error. */
export const controlProps = ({ id, name, hint, error }: FieldProps) => {
  const controlId = id ?? name
  const described = [hint ? `${controlId}-hint` : '', error ? `${controlId}-error` : '']
    .filter(Boolean)
    .join(' ')
  return {
    id: controlId,
    name,
    'aria-invalid': error ? true : undefined,
    'aria-describedby': described || undefined,
  } as const
}
