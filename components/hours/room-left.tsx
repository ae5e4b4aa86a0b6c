import { DescriptionList } from '../ui/description-list'
import { Minutes } from '../ui/minutes'
import { Sheet } from '../ui/sheet'

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
          detail: capMinutes === null ? 'No scope is approved yet' : <Minutes minutes={capMinutes} />,
        },
        { term: 'Posted', detail: <Minutes minutes={postedMinutes} /> },
        ...(capMinutes === null
          ? []
          : [{ term: 'Left under the cap', detail: <Minutes minutes={capMinutes - postedMinutes} /> }]),
        { term: 'Hours of the client', detail: <Minutes minutes={spendableMinutes} /> },
      ]}
    />
  </Sheet>
)
