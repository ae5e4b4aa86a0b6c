import Link from 'next/link'
import type { ReactNode } from 'react'

import { classNames } from './class-names'

export type TabLink = {
  readonly href: string
  readonly label: ReactNode
  readonly count?: number | undefined
  readonly current?: boolean | undefined
}

type TabLinksProps = { readonly label: string; readonly tabs: readonly TabLink[] }

/** The parts of one subject, each with its own address; the current one stands on the sheet below. */
export const TabLinks = ({ label, tabs }: TabLinksProps) => (
  <nav aria-label={label} className="overflow-x-auto border-b border-rule-strong">
    <ul className="flex min-w-max gap-1 px-0.5 pt-0.5">
      {tabs.map((tab) => (
        <li key={tab.href}>
          <Link
            href={tab.href}
            aria-current={tab.current ? 'page' : undefined}
            className={classNames(
              'flex min-h-10 items-center gap-2 border-b-4 px-3 py-1.5 -outline-offset-2',
              tab.current
                ? 'border-copper font-semibold text-ink'
                : 'border-transparent text-ink-soft hover:border-rule-strong hover:text-ink',
            )}
          >
            {tab.label}
            {tab.count === undefined ? null : <span className="num text-xs text-ink-faint">{tab.count}</span>}
          </Link>
        </li>
      ))}
    </ul>
  </nav>
)
