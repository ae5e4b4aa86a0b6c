import { cookies } from 'next/headers'
import type { ReactNode } from 'react'

import { HeaderTimer } from '@/components/hours/header-timer'
import { SignOutForm } from '@/components/identity/sign-out-form'
import { DataProvider } from '@/components/shell/data-provider'
import { PortalShell } from '@/components/shell/portal-shell'
import { ThemeChoice } from '@/components/shell/theme-choice'
import { themeCookie } from '@/components/shell/theme-cookie'
import { TextLink } from '@/components/ui/text-link'
import { navigationFor } from '@/lib/server/navigation'
import { timers } from '@/lib/server/operations'
import { practiceName } from '@/lib/server/practice'
import { query } from '@/lib/server/query'
import { requireActor } from '@/lib/server/session'

export default async function PortalLayout({ children }: { readonly children: ReactNode }) {
  const [actor, jar] = await Promise.all([requireActor(), cookies()])
  const timer = actor.isConsultant ? await query(timers.myTimer) : null
  const theme = jar.get(themeCookie)?.value
  const accountLinks = (
    <>
      <TextLink href="/account">Your account</TextLink>
      <ThemeChoice initial={theme === 'light' || theme === 'dark' ? theme : 'system'} />
    </>
  )
  return (
    <DataProvider>
      <PortalShell
        practiceName={practiceName()}
        navigation={navigationFor(actor)}
        account={{ name: actor.name, email: actor.email }}
        accountLinks={accountLinks}
        headerSlot={actor.isConsultant ? <HeaderTimer initial={timer} /> : undefined}
        signOutAction={<SignOutForm />}
      >
        {children}
      </PortalShell>
    </DataProvider>
  )
}
