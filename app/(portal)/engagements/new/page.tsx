import type { Metadata } from 'next'

import { BriefForm } from '@/components/engagements/brief-form'
import { PageBody } from '@/components/shell/page-body'
import { PageHeader } from '@/components/shell/page-header'
import { EmptyState } from '@/components/ui/empty-state'
import { Notice } from '@/components/ui/notice'
import { Sheet } from '@/components/ui/sheet'
import { requireActor } from '@/lib/server/session'

import { openEngagement } from '../actions'

export const metadata: Metadata = { title: 'Ask for help' }

export default async function NewEngagementPage() {
  const actor = await requireActor()
  const companies = actor.memberships.map(({ companyId, companyName }) => ({ companyId, name: companyName }))
  return (
    <>
      <PageHeader
        title="Ask for help"
        crumbs={[{ label: 'Engagements', href: '/engagements' }, { label: 'Ask for help' }]}
        lead="Write what you know; leave open what you do not. Files come next, when the engagement is open."
      />
      <PageBody aside={companies.length > 0 ? <WhatHelps /> : undefined}>
        {companies.length === 0 ? (
          <EmptyState title="Clients open engagements">
            Your account belongs to no client company, so there is nobody to ask for. A client’s purchaser or
            engineer opens the engagement.
          </EmptyState>
        ) : (
          <Sheet>
            <BriefForm action={openEngagement} companies={companies} />
          </Sheet>
        )}
      </PageBody>
    </>
  )
}

const WhatHelps = () => (
  <Notice title="What helps most">
    <ol className="list-decimal pl-5 text-sm">
      <li>The failing plot as data, with detector, bandwidth and limit</li>
      <li>A capture of the switch node as delimited text, and how it was probed</li>
      <li>Schematic and layout of the power stage</li>
      <li>Photos of the set-up</li>
      <li>What changed from one plot to the next</li>
    </ol>
  </Notice>
)
