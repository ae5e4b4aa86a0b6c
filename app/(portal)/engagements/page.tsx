import type { Metadata } from 'next'

import { EngagementTable } from '@/components/engagements/engagement-table'
import { PageBody } from '@/components/shell/page-body'
import { PageHeader } from '@/components/shell/page-header'
import { EmptyState } from '@/components/ui/empty-state'
import { LinkButton } from '@/components/ui/link-button'
import { Sheet } from '@/components/ui/sheet'
import { engagements } from '@/lib/server/operations'
import { query } from '@/lib/server/query'
import { requireActor } from '@/lib/server/session'

export const metadata: Metadata = { title: 'Engagements' }

export default async function EngagementsPage() {
  const [listed, actor] = await Promise.all([query(engagements.listEngagements), requireActor()])
  const isClient = actor.memberships.length > 0
  const isStaff = actor.isConsultant || actor.isAdministrator
  const ask = <LinkButton href="/engagements/new">Ask for help</LinkButton>
  return (
    <>
      <PageHeader
        title="Engagements"
        lead="One engagement is one question: its evidence, what was found, and the hours it took."
        actions={isClient && listed.length > 0 ? ask : undefined}
      />
      <PageBody>
        {listed.length === 0 ? (
          <EmptyState title="No engagement yet" action={isClient ? ask : undefined}>
            {isClient
              ? 'Describe what you see and what you have measured; the practice answers with a scope and an hour cap.'
              : 'A client opens an engagement with a brief; the administrator then assigns consultants, and it appears here.'}
          </EmptyState>
        ) : (
          <Sheet flush>
            <EngagementTable engagements={listed} withCompany={isStaff || actor.memberships.length > 1} />
          </Sheet>
        )}
      </PageBody>
    </>
  )
}
