import type { ReactNode } from 'react'

export type Description = {
  readonly term: ReactNode
  readonly detail: ReactNode
  readonly key?: string | undefined
}

/** Terms at the left, details at the right, a rule between the pairs; in a narrow place the details end at the right edge. */
export const DescriptionList = ({ items }: { readonly items: readonly Description[] }) => (
  <dl className="@container divide-y divide-rule">
    {items.map((item, index) => (
      <div
        key={item.key ?? index}
        className="flex flex-wrap items-baseline justify-between gap-x-6 py-1.5 @md:grid @md:grid-cols-[minmax(8rem,13rem)_1fr]"
      >
        <dt className="text-sm text-ink-soft">{item.term}</dt>
        <dd className="min-w-0 [overflow-wrap:anywhere]">{item.detail}</dd>
      </div>
    ))}
  </dl>
)
