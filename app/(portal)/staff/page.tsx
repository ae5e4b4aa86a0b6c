import type { Metadata } from 'next'

import { ActionForm } from '@/components/forms/action-form'
import { FormSelect, FormText } from '@/components/forms/form-fields'
import { StaffTable } from '@/components/identity/staff-table'
import { PageBody } from '@/components/shell/page-body'
import { PageHeader } from '@/components/shell/page-header'
import { Sheet } from '@/components/ui/sheet'
import { people } from '@/lib/server/operations'
import { query } from '@/lib/server/query'
import { requireActor } from '@/lib/server/session'

import { disablePerson, inviteStaff } from './actions'

export const metadata: Metadata = { title: 'Staff' }

const roles = [
  { value: 'consultant', label: 'Consultant' },
  { value: 'administrator', label: 'Administrator' },
]

export default async function StaffPage() {
  const [staff, actor] = await Promise.all([query(people.listStaff), requireActor()])
  return (
    <>
      <PageHeader title="Staff" lead="Consultants and administrators of the practice." />
      <PageBody
        aside={
          <Sheet title="Invite a colleague">
            <ActionForm
              action={inviteStaff}
              submitLabel="Send the invitation"
              pendingLabel="Sending…"
              doneMessage="The invitation is on its way."
            >
              <FormText name="email" label="E-mail address" type="email" autoComplete="off" />
              <FormSelect name="role" label="Role" options={roles} placeholder="Choose a role" />
            </ActionForm>
          </Sheet>
        }
      >
        <Sheet flush>
          <StaffTable staff={staff} ownId={actor.personId} disableAction={disablePerson} />
        </Sheet>
      </PageBody>
    </>
  )
}
