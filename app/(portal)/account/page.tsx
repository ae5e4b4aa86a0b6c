import type { Metadata } from 'next'

import { ActionForm } from '@/components/forms/action-form'
import { CertificateSheet } from '@/components/reports/certificate-sheet'
import { PageBody } from '@/components/shell/page-body'
import { PageHeader } from '@/components/shell/page-header'
import { DescriptionList } from '@/components/ui/description-list'
import { Sheet } from '@/components/ui/sheet'
import { certificates } from '@/lib/server/operations'
import { query } from '@/lib/server/query'
import { requireActor } from '@/lib/server/session'

import { createCertificate, signOutEverywhere } from './actions'

export const metadata: Metadata = { title: 'Your account' }

export default async function AccountPage() {
  const actor = await requireActor()
  const staffRoles = [
    ...(actor.isConsultant ? ['Consultant'] : []),
    ...(actor.isAdministrator ? ['Administrator'] : []),
  ]
  return (
    <>
      <PageHeader title="Your account" />
      <PageBody>
        <Sheet title="Who you are here">
          <DescriptionList
            items={[
              { term: 'Name', detail: actor.name },
              { term: 'E-mail address', detail: actor.email },
              ...(staffRoles.length > 0 ? [{ term: 'At the practice', detail: staffRoles.join(', ') }] : []),
              ...actor.memberships.map((membership) => ({
                key: membership.companyId,
                term: membership.companyName,
                detail: membership.role === 'purchaser' ? 'Purchaser' : 'Engineer',
              })),
            ]}
          />
        </Sheet>
        {actor.isConsultant ? (
          <CertificateSheet
            certificate={await query(certificates.myCertificate)}
            create={createCertificate}
          />
        ) : null}
        <Sheet title="Sessions">
          <p className="mb-4 max-w-measure">
            A session ends after two hours without use and after twelve hours in any case. If a device was
            lost, end all of them now.
          </p>
          <ActionForm
            action={signOutEverywhere}
            submitLabel="Sign out everywhere"
            pendingLabel="Ending the sessions…"
            tone="plain"
          />
        </Sheet>
      </PageBody>
    </>
  )
}
