import { DataTable } from '../ui/data-table'
import { Sheet } from '../ui/sheet'
import { StatusMark } from '../ui/status-mark'
import { TextLink } from '../ui/text-link'

type Client = {
  readonly companyId: string
  readonly name: string
  readonly people: readonly { readonly name: string; readonly email: string; readonly role: string }[]
  readonly invited: readonly { readonly email: string; readonly role: string }[]
}

type Row = {
  readonly name: string
  readonly email: string
  readonly role: string
  readonly isInvited: boolean
}

/** One client company with its people and open invitations. */
export const ClientCompany = ({ client }: { readonly client: Client }) => {
  const rows: Row[] = [
    ...client.people.map((person) => ({ ...person, isInvited: false })),
    ...client.invited.map((invitation) => ({ ...invitation, name: '', isInvited: true })),
  ]
  return (
    <Sheet
      title={client.name}
      flush
      actions={<TextLink href={`/companies/${client.companyId}/hours`}>Hours</TextLink>}
    >
      <DataTable
        caption={`People of ${client.name}`}
        captionHidden
        rows={rows}
        rowKey={(row) => `${row.email}${row.role}`}
        columns={[
          { key: 'name', header: 'Name', cell: (row) => row.name || '—', isRowHeader: true },
          { key: 'email', header: 'E-mail address', cell: (row) => row.email },
          { key: 'role', header: 'Role', cell: (row) => row.role },
          {
            key: 'state',
            header: 'State',
            cell: (row) => (
              <StatusMark kind={row.isInvited ? 'waiting' : 'active'}>
                {row.isInvited ? 'Invited' : 'Has joined'}
              </StatusMark>
            ),
          },
        ]}
      />
    </Sheet>
  )
}
