import { DescriptionList } from '../ui/description-list'
import { Sheet } from '../ui/sheet'
import { LedgerMinutes } from './ledger-minutes'

type RoomLeftProps = {
  readonly capMinutes: number | null
  readonly postedMinutes: number
  readonly spendableMinutes: number
}

/** The two bounds of posting: the approved cap and the client's hours. */
export const RoomLeft = ({ capMinutes, postedMinutes, spendableMinutes }: RoomLeftProps) => (
  <Sheet title="Room left">
    <DescriptionList
      items={[
        {
          term: 'Approved cap',
          detail: capMinutes === null ? 'No scope is approved yet' : <LedgerMinutes minutes={capMinutes} />,
        },
        { term: 'Posted', detail: <LedgerMinutes minutes={postedMinutes} /> },
        ...(capMinutes === null
          ? []
          : [{ term: 'Left under the cap', detail: <LedgerMinutes minutes={capMinutes - postedMinutes} /> }]),
        { term: 'Hours of the client', detail: <LedgerMinutes minutes={spendableMinutes} /> },
      ]}
    />
  </Sheet>
)
