import type { ReactNode } from 'react'

import { DescriptionList, type Description } from './description-list'
import { Disclosure } from './disclosure'
import { Quantity } from './quantity'

type OpenNumberProps = {
  readonly label: ReactNode
  readonly value: string
  readonly unit?: string | undefined
  /** The 95 % interval as written, e.g. "2.04 to 2.37". */
  readonly interval?: string | undefined
  readonly formula?: ReactNode
  readonly source?: ReactNode
  readonly inputs?: ReactNode
  readonly evidence?: ReactNode
  /** Validity limits that were checked, assumptions, or how to recompute it. */
  readonly remarks?: ReactNode
}

/** A number that opens to where it came from: formula, published source, inputs, and the bytes of evidence. */
export const OpenNumber = ({ label, value, unit, interval, ...origin }: OpenNumberProps) => {
  const items: Description[] = [
    { key: 'formula', term: 'Formula', detail: origin.formula },
    { key: 'source', term: 'Source', detail: origin.source },
    { key: 'inputs', term: 'Inputs', detail: origin.inputs },
    { key: 'evidence', term: 'Evidence', detail: origin.evidence },
    { key: 'remarks', term: 'Remarks', detail: origin.remarks },
  ].filter((item) => item.detail !== undefined && item.detail !== null)
  return (
    <Disclosure
      summary={
        <span className="flex flex-wrap items-baseline justify-between gap-x-6">
          <span>{label}</span>
          <span className="ml-auto flex flex-wrap items-baseline justify-end gap-x-3">
            {interval ? <span className="num text-sm text-ink-soft">{`95 %: ${interval}`}</span> : null}
            <Quantity value={value} unit={unit} />
          </span>
        </span>
      }
    >
      <DescriptionList items={items} />
    </Disclosure>
  )
}
