import type { FormAction } from '@/lib/core/action-state'

import { Sheet } from '../ui/sheet'
import { PersonStep } from './people-sheet'

type AssignmentSheetProps = {
  readonly engagementId: string
  readonly consultants: readonly {
    readonly personId: string
    readonly name: string
    readonly isAssigned: boolean
  }[]
  readonly assign: FormAction
  readonly release: FormAction
}

/** The administrator's part: who of the practice works on the engagement. */
export const AssignmentSheet = ({ engagementId, consultants, assign, release }: AssignmentSheetProps) => {
  const assigned = consultants.filter((consultant) => consultant.isAssigned)
  const free = consultants.filter((consultant) => !consultant.isAssigned)
  return (
    <Sheet title="Assigned consultants">
      {assigned.length === 0 ? (
        <p className="text-ink-soft">
          Nobody is assigned yet. The client waits for a scope: assign a consultant.
        </p>
      ) : (
        <ul>
          {assigned.map((consultant) => (
            <li key={consultant.personId}>{consultant.name}</li>
          ))}
        </ul>
      )}
      <div className="mt-4 flex flex-col gap-1 border-t border-rule pt-3">
        <PersonStep
          summary="Assign a consultant"
          none="Every consultant is assigned. Invite another under Staff."
          people={free}
          engagementId={engagementId}
          action={assign}
        />
        <PersonStep
          summary="Release a consultant"
          none="Nobody is assigned."
          people={assigned}
          engagementId={engagementId}
          action={release}
        />
      </div>
    </Sheet>
  )
}
