'use client'

import type { ReactNode } from 'react'
import { Button, Dialog, DialogTrigger, Popover } from 'react-aria-components'

import { buttonClass } from '../ui/button-class'

export type Account = { readonly name: string; readonly email: string }

type AccountMenuProps = {
  readonly account: Account
  /** Links and the sign-out form. */
  readonly children: ReactNode
}

const initials = (name: string): string =>
  name
    .split(/\s+/)
    .map((word) => word.charAt(0))
    .slice(0, 2)
    .join('')
    .toUpperCase()

/** Who is signed in, and the way out. */
export const AccountMenu = ({ account, children }: AccountMenuProps) => (
  <DialogTrigger>
    <Button aria-label={`Account of ${account.name}`} className={buttonClass('quiet', 'small', 'min-h-11')}>
      <span aria-hidden="true" className="num rounded border border-rule-strong px-1.5 py-0.5 text-xs">
        {initials(account.name)}
      </span>
      <span className="hidden max-w-40 truncate lg:inline">{account.name}</span>
    </Button>
    <Popover
      placement="bottom end"
      className="w-72 max-w-[calc(100vw-2rem)] rounded border border-rule-strong bg-sheet shadow-lift"
    >
      <Dialog aria-label="Account" className="outline-none">
        <div className="border-b border-rule px-4 py-3">
          <p className="font-semibold">{account.name}</p>
          <p className="text-sm text-ink-soft [overflow-wrap:anywhere]">{account.email}</p>
        </div>
        <div className="flex flex-col gap-3 px-4 py-3">{children}</div>
      </Dialog>
    </Popover>
  </DialogTrigger>
)
