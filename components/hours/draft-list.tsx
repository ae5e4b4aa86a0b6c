import type { FormAction } from '@/lib/core/action-state'

import { ActionForm } from '../forms/action-form'
import { minutesInWords } from '../ui/minutes'
import { Sheet } from '../ui/sheet'
import { Timestamp } from '../ui/timestamp'
import { workKindLabel } from './work-kinds'

type Draft = {
  readonly timeEntryId: string
  readonly workKind: string
  readonly text: string
  readonly startedAt: number
  readonly workedSeconds: number
  readonly minutes: number
}

type DraftListProps = {
  readonly drafts: readonly Draft[]
  readonly post: FormAction
  readonly discard: FormAction
}

const worked = (seconds: number): string =>
  seconds < 60 ? `${seconds} s` : minutesInWords(Math.floor(seconds / 60))

/** One's own time that nobody else sees yet, with what posting it would debit. */
export const DraftList = ({ drafts, post, discard }: DraftListProps) => (
  <Sheet title="Your drafts">
    {drafts.length === 0 ? (
      <p className="text-ink-soft">Nothing to post. Time from the timer appears here when you stop it.</p>
    ) : (
      <ul className="divide-y divide-rule">
        {drafts.map((draft) => (
          <li key={draft.timeEntryId} className="flex flex-col gap-3 py-4 first:pt-0 last:pb-0">
            <div>
              <p className="font-semibold [overflow-wrap:anywhere]">{draft.text}</p>
              <p className="text-sm text-ink-soft">
                {workKindLabel(draft.workKind)}, <Timestamp instant={draft.startedAt} />, worked{' '}
                {worked(draft.workedSeconds)}
              </p>
            </div>
            <div className="flex flex-wrap items-start gap-3">
              <ActionForm
                action={post}
                hidden={{ timeEntryId: draft.timeEntryId }}
                submitLabel={`Post ${minutesInWords(draft.minutes)}`}
                pendingLabel="Posting…"
                size="small"
                label={`Post: ${draft.text}`}
              />
              <ActionForm
                action={discard}
                hidden={{ timeEntryId: draft.timeEntryId }}
                submitLabel="Discard"
                pendingLabel="Discarding…"
                size="small"
                tone="quiet"
                label={`Discard: ${draft.text}`}
              />
            </div>
          </li>
        ))}
      </ul>
    )}
  </Sheet>
)
