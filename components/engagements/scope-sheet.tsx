import type { FormAction } from '@/lib/core/action-state'
import type { ScopeDto } from '@/lib/domain/engagements/scope-dto'

import { Disclosure } from '../ui/disclosure'
import { Sheet } from '../ui/sheet'
import { ScopeDecision } from './scope-decision'
import { ScopeEditor } from './scope-editor'
import { ScopeVersion } from './scope-version'

type ScopeSheetProps = {
  readonly engagementId: string
  /** Newest first. */
  readonly scopes: readonly ScopeDto[]
  readonly writing?: { readonly save: FormAction; readonly propose: FormAction } | undefined
  readonly deciding?: { readonly approve: FormAction; readonly decline: FormAction } | undefined
}

export const ScopeSheet = ({ engagementId, scopes, writing, deciding }: ScopeSheetProps) => {
  const withStatus = (status: ScopeDto['status']) => scopes.find((scope) => scope.status === status)
  const [draft, proposed, approved] = [withStatus('draft'), withStatus('proposed'), withStatus('approved')]
  const inView = [proposed, approved].filter((scope) => scope !== undefined)
  const earlier = scopes.filter((scope) => scope !== draft && !inView.includes(scope))
  return (
    <Sheet title="Scope" id="scope">
      <div className="flex flex-col gap-6">
        {inView.length === 0 ? <p className="text-ink-soft">{nothingYet(writing !== undefined)}</p> : null}
        {inView.map((scope) => (
          <div key={scope.scopeId}>
            <ScopeVersion scope={scope} />
            {deciding && scope === proposed ? <ScopeDecision scope={scope} {...deciding} /> : null}
          </div>
        ))}
        {writing ? (
          <ScopeEditor engagementId={engagementId} draft={draft} basis={proposed ?? approved} {...writing} />
        ) : null}
        {earlier.length > 0 ? (
          <Disclosure summary="Earlier versions">
            <div className="flex flex-col gap-5">
              {earlier.map((scope) => (
                <ScopeVersion key={scope.scopeId} scope={scope} />
              ))}
            </div>
          </Disclosure>
        ) : null}
      </div>
    </Sheet>
  )
}

const nothingYet = (isWriter: boolean): string =>
  isWriter
    ? 'No scope is agreed yet. Write what will be done and the hours it may take, then propose it.'
    : 'No scope is agreed yet. The consultant writes one with an hour cap; the purchaser approves it before work begins.'
