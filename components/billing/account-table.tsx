import { LedgerMinutes } from '../hours/ledger-minutes'
import { DataTable } from '../ui/data-table'
import { TextLink } from '../ui/text-link'
import { CheckList, type Check } from './check-list'

type Account = {
  readonly companyId: string
  readonly companyName: string
  readonly creditedMinutes: number
  readonly debitedMinutes: number
  readonly balanceMinutes: number
  readonly checks: readonly Check[]
}

/** Credits, debits and balance of every company. */
export const AccountTable = ({ accounts }: { readonly accounts: readonly Account[] }) => (
  <DataTable
    caption="Hours of the clients"
    captionHidden
    rows={accounts}
    rowKey={(account) => account.companyId}
    columns={[
      {
        key: 'company',
        header: 'Client',
        isRowHeader: true,
        cell: (account) => (
          <span className="block min-w-36">
            <TextLink href={`/companies/${account.companyId}/hours`}>{account.companyName}</TextLink>
          </span>
        ),
      },
      {
        key: 'credit',
        header: 'Credited',
        align: 'end',
        cell: (account) => <LedgerMinutes minutes={account.creditedMinutes} />,
      },
      {
        key: 'debit',
        header: 'Debited',
        align: 'end',
        cell: (account) => <LedgerMinutes minutes={account.debitedMinutes} />,
      },
      {
        key: 'balance',
        header: 'Balance',
        align: 'end',
        cell: (account) => <LedgerMinutes minutes={account.balanceMinutes} />,
      },
      { key: 'checks', header: 'Checks', cell: (account) => <CheckList checks={account.checks} /> },
    ]}
  />
)
