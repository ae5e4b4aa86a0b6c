'use client'

import { useEffect, useRef } from 'react'

export type FormError = {
  /** The id of the field (its name unless set otherwise); absent for an error of the whole form. */
  readonly fieldId?: string | undefined
  readonly message: string
}

type FormErrorSummaryProps = {
  readonly title?: string | undefined
  readonly errors: readonly FormError[]
}

/** Above a refused form: every error as a link to its field. Takes the focus when it appears. */
export const FormErrorSummary = ({
  title = 'Nothing was saved yet. Please look at these points:',
  errors,
}: FormErrorSummaryProps) => {
  const box = useRef<HTMLDivElement>(null)
  useEffect(() => {
    if (errors.length > 0) box.current?.focus()
  }, [errors])

  if (errors.length === 0) return null
  return (
    <div
      ref={box}
      tabIndex={-1}
      role="alert"
      className="rounded border border-over-limit border-l-4 bg-over-limit-wash px-4 py-3"
    >
      <p className="font-semibold text-over-limit">{title}</p>
      <ul className="mt-1 list-disc pl-5">
        {errors.map((error) => (
          <li key={`${error.fieldId ?? ''}${error.message}`}>
            {error.fieldId ? (
              <a href={`#${error.fieldId}`} className="text-link inline-block py-0.5">
                {error.message}
              </a>
            ) : (
              error.message
            )}
          </li>
        ))}
      </ul>
    </div>
  )
}
