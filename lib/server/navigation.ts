import 'server-only'

import type { Actor } from '@/lib/authz/actor'

export type NavigationEntry = { readonly label: string; readonly href: string }

/** The places that a person's roles give them, in the order of their day. */
export function navigationFor(actor: Actor): readonly NavigationEntry[] {
  const entries: NavigationEntry[] = []
  if (actor.isConsultant || actor.isAdministrator || actor.memberships.length > 0) {
    entries.push({ label: 'Engagements', href: '/engagements' })
  }
  const isInSeveral = actor.memberships.length > 1
  for (const { companyId, companyName } of actor.memberships) {
    const suffix = isInSeveral ? ` · ${companyName}` : ''
    entries.push({ label: `Hours${suffix}`, href: `/companies/${companyId}/hours` })
    entries.push({ label: `People${suffix}`, href: `/companies/${companyId}/people` })
  }
  entries.push({ label: 'Methods', href: '/methods' })
  if (actor.isAdministrator) {
    entries.push(
      { label: 'Clients', href: '/clients' },
      { label: 'Staff', href: '/staff' },
      { label: 'Books', href: '/books' },
    )
  }
  return entries
}
