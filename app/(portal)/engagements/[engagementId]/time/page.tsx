import type { Metadata } from 'next'

import { DraftList } from '@/components/hours/draft-list'
import { ManualEntryForm } from '@/components/hours/manual-entry-form'
import { PostedTable } from '@/components/hours/posted-table'
import { RoomLeft } from '@/components/hours/room-left'
import { RunningTimer } from '@/components/hours/running-timer'
import { TimerForm } from '@/components/hours/timer-form'
import { PageBody } from '@/components/shell/page-body'
import { EmptyState } from '@/components/ui/empty-state'
import { Sheet } from '@/components/ui/sheet'
import { posting, timers } from '@/lib/server/operations'
import { query } from '@/lib/server/query'

import { addTime, discardTime, editTime, postTime, startTimer } from './actions'

export const metadata: Metadata = { title: 'Time' }

export default async function TimePage({ params }: PageProps<'/engagements/[engagementId]/time'>) {
  const { engagementId } = await params
  const time = await query(posting.engagementTime, { engagementId })
  const running = time.mayTrack ? await query(timers.myTimer) : null
  return (
    <PageBody
      aside={
        <>
          <RoomLeft {...time} />
          {time.mayTrack && running === null ? (
            <TimerForm engagementId={engagementId} start={startTimer} />
          ) : null}
          {running ? <RunningTimer text={running.text} startedAt={running.startedAt} /> : null}
        </>
      }
    >
      {time.mayTrack ? (
        <>
          <DraftList
            drafts={time.drafts}
            room={time}
            actions={{ post: postTime, edit: editTime, discard: discardTime }}
          />
          <ManualEntryForm engagementId={engagementId} add={addTime} />
        </>
      ) : null}
      {time.posted.length === 0 ? (
        <EmptyState title="No time posted yet">
          Consultants post their time here, each entry with what was done.
        </EmptyState>
      ) : (
        <Sheet title="Posted time" flush>
          <PostedTable posted={time.posted} postedMinutes={time.postedMinutes} />
        </Sheet>
      )}
    </PageBody>
  )
}
