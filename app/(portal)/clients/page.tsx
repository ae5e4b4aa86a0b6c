import type { Metadata } from 'next'

import { ActionForm } from '@/components/forms/action-form'
import { FormText } from '@/components/forms/form-fields'
import { ClientCompany } from '@/components/identity/client-company'
import { PageBody } from '@/components/shell/page-body'
import { PageHeader } from '@/components/shell/page-header'
import { EmptyState } from '@/components/ui/empty-state'
import { Sheet } from '@/components/ui/sheet'
import { people } from '@/lib/server/operations'
import { query } from '@/lib/server/query'

import { inviteCompany } from './actions'

export const metadata: Metadata = { title: 'Clients' }

export default async function ClientsPage() {
  const clients = await query(people.listClients)
  return (
    <>
      <PageHeader title="Clients" lead="Companies that buy hours, and the people who speak for them." />
      <PageBody
        aside={
          <Sheet title="Invite a company">
            <ActionForm
              action={inviteCompany}
              submitLabel="Send the invitation"
              pendingLabel="Sending…"
              doneMessage="The invitation is on its way."
            >
              <FormText name="companyName" label="Company" autoComplete="off" />
              <FormText
                name="email"
                label="E-mail address of its purchaser"
                type="email"
                autoComplete="off"
                hint="This person buys hours, approves scopes and invites colleagues"
              />
            </ActionForm>
          </Sheet>
        }
      >
        {clients.length === 0 ? (
          <EmptyState title="No client yet">Invite the first company with the form on this page.</EmptyState>
        ) : (
          clients.map((client) => <ClientCompany key={client.companyId} client={client} />)
        )}
      </PageBody>
    </>
  )
}
