import type { ReactNode } from 'react'

import { SkipLink } from '../ui/skip-link'
import { AccountMenu, type Account } from './account-menu'
import type { NavigationItem } from './navigation-item'
import { NavigationLinks } from './navigation-links'
import { PhoneNavigation } from './phone-navigation'
import { PracticeMark } from './practice-mark'
import { TitleBlock } from './title-block'

type AppShellProps = {
  readonly practiceName: string
  readonly homeHref?: string | undefined
  readonly navigation: readonly NavigationItem[]
  readonly account: Account
  /** What must stay in sight on every page, e.g. the running timer. */
  readonly headerSlot?: ReactNode
  /** Links shown in the account menu above the way out. */
  readonly accountLinks?: ReactNode
  /** The form that signs out. */
  readonly signOutAction: ReactNode
  readonly children: ReactNode
}

/** Every page of a signed-in person: a ruled header, the page on the bench, a title block at the foot. */
export const AppShell = ({
  practiceName,
  homeHref = '/',
  navigation,
  account,
  headerSlot,
  accountLinks,
  signOutAction,
  children,
}: AppShellProps) => (
  <div className="flex min-h-dvh flex-col bg-ground">
    <SkipLink />
    <header className="no-print relative border-b border-rule-strong bg-sheet">
      <div className="mx-auto flex max-w-page items-center gap-x-3 px-4 py-1.5 sm:px-6">
        <div className="min-w-0 flex-1">
          <PracticeMark practiceName={practiceName} href={homeHref} />
        </div>
        {headerSlot ? <div className="hidden md:block">{headerSlot}</div> : null}
        <AccountMenu account={account}>
          {accountLinks}
          {signOutAction}
        </AccountMenu>
        <PhoneNavigation items={navigation} />
      </div>
      <nav aria-label="Main" className="hidden border-t border-rule md:block">
        <div className="mx-auto max-w-page px-2.5 sm:px-6 [&>ul]:-ml-3.5">
          <NavigationLinks items={navigation} direction="row" />
        </div>
      </nav>
      {headerSlot ? <div className="border-t border-rule px-4 py-1.5 md:hidden">{headerSlot}</div> : null}
    </header>
    <main id="main" tabIndex={-1} className="flex-1">
      {children}
    </main>
    <TitleBlock practiceName={practiceName} />
  </div>
)
