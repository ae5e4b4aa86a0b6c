import Link from 'next/link'

import { classNames } from '../ui/class-names'
import type { NavigationItem } from './navigation-item'

type NavigationLinksProps = {
  readonly items: readonly NavigationItem[]
  /** Along the header's lower edge, or one below the other in the phone's menu. */
  readonly direction: 'row' | 'column'
}

const rowLook =
  'flex min-h-11 items-center border-b-4 border-t-4 border-t-transparent px-3.5 -outline-offset-2'
const columnLook = 'flex min-h-11 items-center border-l-4 px-4 -outline-offset-2'

export const NavigationLinks = ({ items, direction }: NavigationLinksProps) => (
  <ul className={direction === 'row' ? 'flex flex-wrap' : 'divide-y divide-rule'}>
    {items.map((item) => (
      <li key={item.href}>
        <Link
          href={item.href}
          aria-current={item.current ? 'page' : undefined}
          className={classNames(
            direction === 'row' ? rowLook : columnLook,
            item.current
              ? 'border-copper font-semibold text-ink'
              : 'border-transparent text-ink-soft hover:border-rule-strong hover:text-ink',
          )}
        >
          {item.label}
        </Link>
      </li>
    ))}
  </ul>
)
