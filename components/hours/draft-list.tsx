import { minutesInWords } from '../ui/minutes'
import { Sheet } from '../ui/sheet'
import { DraftEntry, type Draft, type DraftActions } from './draft-entry'

/** The two bounds of posting, as they stand now. */
export type Room = {
  readonly capMinutes: number | null
  readonly postedMinutes: number
  readonly spendableMinutes: number
}

type DraftListProps = {
  readonly drafts: readonly Draft[]
  readonly room: Room
  readonly actions: DraftActions
}

/** Why a draft of this length cannot be posted as things stand; posting itself decides. */
function obstacleTo(minutes: number, { capMinutes, postedMinutes, spendableMinutes }: Room): string | null {
  if (capMinutes === null) return 'It cannot be posted before a scope is approved.'
  const left = Math.max(0, capMinutes - postedMinutes)
  if (minutes > left) {
    return `Past the approved cap: ${minutesInWords(left)} are left under it. Propose a scope with a higher cap.`
  }
  return minutes > spendableMinutes
    ? `The client has ${minutesInWords(spendableMinutes)} to spend. The purchaser can buy hours.`
    : null
}

/** One's own time that nobody else sees yet, with what posting it would debit. */
export const DraftList = ({ drafts, room, actions }: DraftListProps) => (
  <Sheet title="Your drafts">
    {drafts.length === 0 ? (
      <p className="text-ink-soft">Nothing to post. Time from the timer appears here when you stop it.</p>
    ) : (
      <>
        <p className="mb-4 text-sm text-ink-soft">
          Seen by you alone until you post them. Every six minutes begun count whole.
        </p>
        <ul className="divide-y divide-rule">
          {drafts.map((draft) => (
            <DraftEntry
              key={draft.timeEntryId}
              draft={draft}
              actions={actions}
              obstacle={obstacleTo(draft.minutes, room)}
            />
          ))}
        </ul>
      </>
    )}
  </Sheet>
)
