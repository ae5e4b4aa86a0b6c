import type { ScopeDto } from '@/lib/domain/engagements/scope-dto'

import { Minutes } from '../ui/minutes'
import { StatusMark, type StatusKind } from '../ui/status-mark'
import { Timestamp } from '../ui/timestamp'

const marks: Record<ScopeDto['status'], { readonly kind: StatusKind; readonly words: string }> = {
  draft: { kind: 'draft', words: 'Draft' },
  proposed: { kind: 'attention', words: 'Waits for the purchaser' },
  approved: { kind: 'active', words: 'In force' },
  declined: { kind: 'closed', words: 'Declined' },
  superseded: { kind: 'closed', words: 'Superseded' },
}

export const ScopeVersion = ({ scope }: { readonly scope: ScopeDto }) => {
  const mark = marks[scope.status]
  return (
    <article aria-label={`Scope, version ${scope.version}`}>
      <div className="flex flex-wrap items-baseline gap-x-5 gap-y-1">
        <h3 className="text-base">Version {scope.version}</h3>
        <StatusMark kind={mark.kind}>{mark.words}</StatusMark>
        <span>
          Cap <Minutes minutes={scope.capMinutes} />
        </span>
      </div>
      <p className="mt-2 max-w-measure whitespace-pre-line">{scope.body}</p>
      <p className="mt-2 text-sm text-ink-soft">
        Written by {scope.author}
        {scope.proposedAt === null ? null : (
          <>
            , proposed <Timestamp instant={scope.proposedAt} />
          </>
        )}
        {scope.decidedBy === null || scope.decidedAt === null ? null : (
          <>
            ; {scope.decisionNote === null ? 'approved' : 'declined'} by {scope.decidedBy},{' '}
            <Timestamp instant={scope.decidedAt} />
          </>
        )}
        .
      </p>
      {scope.decisionNote ? <p className="mt-1 max-w-measure">“{scope.decisionNote}”</p> : null}
    </article>
  )
}
