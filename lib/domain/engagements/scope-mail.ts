import 'server-only'

import type { Tx } from '@/db/client'
import type { EngagementRow } from '@/db/repositories/engagement.repo'
import { listPeopleOfCompany } from '@/db/repositories/person.repo'
import type { ScopeRow } from '@/db/repositories/scope.repo'
import type { Actor } from '@/lib/authz/actor'

import type { Deps } from '../deps'
import { queueMail } from '../mail'

/** Tells every purchaser of the company that a scope waits for a decision. */
export async function mailProposal(
  tx: Tx,
  deps: Deps,
  proposer: Actor,
  engagement: EngagementRow,
  scope: ScopeRow,
): Promise<void> {
  const people = await listPeopleOfCompany(tx, engagement.company_id)
  for (const purchaser of people.filter((person) => person.role === 'purchaser')) {
    await queueMail(tx, deps, {
      to: purchaser.email,
      dedupeKey: `scope_proposed:${scope.id}:${purchaser.personId}`,
      mail: {
        kind: 'scope_proposed',
        engagementTitle: engagement.title,
        capMinutes: scope.cap_minutes,
        proposedBy: proposer.name,
        link: `${deps.settings.publicUrl}/engagements/${engagement.id}`,
      },
    })
  }
}
