import { redirect } from 'next/navigation'

import { requireActor } from '@/lib/server/session'

export default async function HomePage() {
  const actor = await requireActor()
  const hasEngagements = actor.isConsultant || actor.memberships.length > 0
  redirect(hasEngagements || !actor.isAdministrator ? '/engagements' : '/clients')
}
