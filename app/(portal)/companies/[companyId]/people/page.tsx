import type { Metadata } from 'next'

import { ActionForm } from '@/components/forms/action-form'
import { FormSelect, FormText } from '@/components/forms/form-fields'
import { PageBody } from '@/components/shell/page-body'
import { PageHeader } from '@/components/shell/page-header'
import { DataTable } from '@/components/ui/data-table'
import { Sheet } from '@/components/ui/sheet'
import { people } from '@/lib/server/operations'
import { query } from '@/lib/server/query'
import { requireActor } from '@/lib/server/session'

import { inviteColleague } from './actions'

export const metadata: Metadata = { title: 'People' }

const roles = [
  { value: 'engineer', label: 'Engineer' },
  { value: 'purchaser', label: 'Purchaser' },
]

export default async function PeoplePage({ params }: PageProps<'/companies/[companyId]/people'>) {
  const { companyId } = await params
  const [colleagues, actor] = await Promise.all([query(people.listColleagues, { companyId }), requireActor()])
  const membership = actor.memberships.find((held) => held.companyId === companyId)
  const invitation =
    membership?.role === 'purchaser' ? (
      <Sheet title="Invite a colleague">
        <ActionForm
          action={inviteColleague}
          hidden={{ companyId }}
          submitLabel="Send the invitation"
          pendingLabel="Sending…"
          doneMessage="The invitation is on its way."
        >
          <FormText name="email" label="E-mail address" type="email" autoComplete="off" />
          <FormSelect name="role" label="Role" options={roles} placeholder="Choose a role" />
        </ActionForm>
      </Sheet>
    ) : undefined
  return (
    <>
      <PageHeader title="People" lead={membership?.companyName} />
      <PageBody aside={invitation}>
        <Sheet flush>
          <DataTable
            caption="People of the company"
            captionHidden
            rows={colleagues}
            rowKey={(colleague) => colleague.personId}
            columns={[
              { key: 'name', header: 'Name', cell: (colleague) => colleague.name, isRowHeader: true },
              { key: 'email', header: 'E-mail address', cell: (colleague) => colleague.email },
              { key: 'role', header: 'Role', cell: (colleague) => colleague.role },
            ]}
          />
        </Sheet>
      </PageBody>
    </>
  )
}
