import type { ReactNode } from 'react'

import { classNames } from './class-names'

type FieldGroupProps = {
  readonly legend: ReactNode
  readonly hint?: ReactNode
  /** Two short fields side by side from tablet width up. */
  readonly columns?: 1 | 2 | 3 | undefined
  readonly children: ReactNode
}

const widths = { 1: '', 2: 'sm:grid-cols-2', 3: 'sm:grid-cols-2 lg:grid-cols-3' } as const

/** Fields that belong together, under a ruled heading. */
export const FieldGroup = ({ legend, hint, columns = 1, children }: FieldGroupProps) => (
  <fieldset className="min-w-0 border-t border-rule-strong pt-3">
    <legend className="pr-3 font-serif text-lg font-semibold">{legend}</legend>
    {hint ? <p className="mb-3 max-w-measure text-sm text-ink-soft">{hint}</p> : null}
    <div className={classNames('field-grid', widths[columns])}>{children}</div>
  </fieldset>
)
