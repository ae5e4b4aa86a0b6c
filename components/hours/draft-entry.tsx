import type { FormAction } from '@/lib/core/action-state'

import { ActionForm } from '../forms/action-form'
import { Disclosure } from '../ui/disclosure'
import { minutesInWords } from '../ui/minutes'
import { StatusMark } from '../ui/status-mark'
import { Timestamp } from '../ui/timestamp'
import { TimeFields } from './time-fields'
import { workKindLabel } from './work-kinds'

export type Draft = {
  readonly timeEntryId: string
  readonly workKind: string
  readonly text: string
  readonly startedAt: number
  readonly workedSeconds: number
  readonly minutes: number
}

export type DraftActions = {
  readonly post: FormAction
  readonly edit: FormAction
  readonly discard: FormAction
}

type DraftEntryProps = {
  readonly draft: Draft
  readonly actions: DraftActions
  /** What posting it now would run into, if anything. */
  readonly obstacle: string | null
}

/** Longer than this without a break, somebody has probably forgotten to stop the timer. */
const longSeconds = 4 * 3600

const worked = (seconds: number): string =>
  seconds < 60 ? `${seconds} s` : minutesInWords(Math.floor(seconds / 60))

/** One draft: what it says, what posting it would debit, and the ways to correct or drop it. */
export const DraftEntry = ({ draft, actions, obstacle }: DraftEntryProps) => {
  const { timeEntryId, text } = draft
  return (
    <li className="flex flex-col gap-3 py-4 first:pt-0 last:pb-0">
      <div>
        <p className="font-semibold [overflow-wrap:anywhere]">{text}</p>
        <p className="text-sm text-ink-soft">
          {workKindLabel(draft.workKind)}, <Timestamp instant={draft.startedAt} />, worked{' '}
          {worked(draft.workedSeconds)}, counts as {minutesInWords(draft.minutes)}
        </p>
        {draft.workedSeconds > longSeconds ? (
          <StatusMark kind="attention">Longer than 4 h: check its times</StatusMark>
        ) : null}
        {obstacle === null ? null : <p className="text-sm text-over-limit">{obstacle}</p>}
      </div>
      <div className="flex flex-wrap items-start gap-3">
        <ActionForm
          action={actions.post}
          hidden={{ timeEntryId }}
          submitLabel={`Post ${minutesInWords(draft.minutes)}`}
          pendingLabel="Posting…"
          size="small"
          tone={obstacle === null ? 'primary' : 'plain'}
          label={`Post: ${text}`}
        />
        <ActionForm
          action={actions.discard}
          hidden={{ timeEntryId }}
          submitLabel="Discard"
          pendingLabel="Discarding…"
          size="small"
          tone="quiet"
          label={`Discard: ${text}`}
        />
      </div>
      <Disclosure summary="Correct it">
        <ActionForm
          action={actions.edit}
          hidden={{ timeEntryId }}
          submitLabel="Save the correction"
          pendingLabel="Saving…"
          tone="plain"
          size="small"
          label={`Correct: ${text}`}
        >
          <TimeFields idPrefix={timeEntryId} start={draft} />
        </ActionForm>
      </Disclosure>
    </li>
  )
}
