import type { FormAction } from '@/lib/core/action-state'

import { ActionForm } from '../forms/action-form'
import { DataTable } from '../ui/data-table'
import { Dialog } from '../ui/dialog'
import { StatusMark } from '../ui/status-mark'

type Member = {
  readonly personId: string
  readonly name: string
  readonly email: string
  readonly isConsultant: boolean
  readonly isAdministrator: boolean
  readonly isDisabled: boolean
}

type StaffTableProps = {
  readonly staff: readonly Member[]
  readonly ownId: string
  readonly disableAction: FormAction
}

const rolesOf = (member: Member): string =>
  [member.isConsultant ? 'Consultant' : '', member.isAdministrator ? 'Administrator' : '']
    .filter(Boolean)
    .join(', ')

/** Everybody of the practice, and the way to shut somebody out. */
export const StaffTable = ({ staff, ownId, disableAction }: StaffTableProps) => (
  <DataTable
    caption="People of the practice"
    captionHidden
    rows={staff}
    rowKey={(member) => member.personId}
    columns={[
      { key: 'name', header: 'Name', cell: (member) => member.name, isRowHeader: true },
      { key: 'email', header: 'E-mail address', cell: (member) => member.email },
      { key: 'roles', header: 'Roles', cell: rolesOf },
      {
        key: 'state',
        header: 'State',
        cell: (member) =>
          member.isDisabled ? (
            <StatusMark kind="closed">Shut out</StatusMark>
          ) : (
            <StatusMark kind="active">May sign in</StatusMark>
          ),
      },
      {
        key: 'act',
        header: <span className="sr-only">Actions</span>,
        cell: (member) =>
          member.isDisabled || member.personId === ownId ? null : (
            <Dialog
              title={`Shut out ${member.name}?`}
              trigger="Shut out"
              triggerTone="quiet"
              triggerSize="small"
            >
              <p className="mb-4 max-w-measure">
                Every session ends at once and signing in is refused. Findings, time and signatures stay.
              </p>
              <ActionForm
                action={disableAction}
                hidden={{ personId: member.personId }}
                submitLabel={`Shut out ${member.name}`}
                pendingLabel="Ending the sessions…"
              />
            </Dialog>
          ),
      },
    ]}
  />
)
