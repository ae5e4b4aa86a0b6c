import 'server-only'

import { setEngagementStatus } from '@/db/repositories/engagement.repo'
import {
  findScope,
  findScopeWithStatus,
  insertScope,
  nextScopeVersion,
  supersedeScopes,
  updateScope,
} from '@/db/repositories/scope.repo'
import { withTx } from '@/db/tx'
import { notFound, type Denial } from '@/lib/authz/authorize'
import { err, ok, type Result } from '@/lib/core/result'

import { operation } from '../operation'
import { engagementFor } from './engagement-resource'
import { scopeNotOpen, scopeNotSaved, type EngagementError } from './engagements.errors'
import { declineScopeSchema, saveScopeSchema, scopeIdSchema } from './engagements.schema'
import { mailProposal } from './scope-mail'

export type ScopeDecision = { readonly engagementId: string; readonly version: number }

/** Writes the consultant's draft: the text and the hour cap. A draft that exists is changed, else a version begins. */
export const saveScope = operation('engagements.saveScope', saveScopeSchema, async (deps, actor, input) =>
  withTx(deps.db, async (tx) => {
    const engagement = await engagementFor(tx, actor, 'scope.write', input.engagementId)
    if (!engagement.ok) return engagement
    const draft = await findScopeWithStatus(tx, input.engagementId, 'draft')
    if (draft) {
      await updateScope(tx, draft.id, {
        body: input.body,
        cap_minutes: input.capHours,
        author_id: actor.personId,
      })
      return ok({ scopeId: draft.id, version: draft.version })
    }
    const scopeId = deps.ids.newId()
    const version = await nextScopeVersion(tx, input.engagementId)
    await insertScope(tx, {
      id: scopeId,
      engagement_id: input.engagementId,
      version,
      body: input.body,
      cap_minutes: input.capHours,
      status: 'draft',
      author_id: actor.personId,
      created_at: deps.clock.now(),
      proposed_at: null,
      decided_by: null,
      decided_at: null,
      decision_note: null,
    })
    return ok({ scopeId, version })
  }),
)

/** Puts the draft before the company's purchasers, by mail too; a proposal that still waits gives way to it. */
export const proposeScope = operation('engagements.proposeScope', scopeIdSchema, async (deps, actor, input) =>
  withTx(deps.db, async (tx): Promise<Result<ScopeDecision, EngagementError | Denial>> => {
    const scope = await findScope(tx, input.scopeId)
    if (!scope) return err(notFound)
    const engagement = await engagementFor(tx, actor, 'scope.write', scope.engagement_id)
    if (!engagement.ok) return engagement
    if (scope.status !== 'draft') return err(scopeNotSaved)
    const { row } = engagement.value
    await supersedeScopes(tx, row.id, 'proposed')
    await updateScope(tx, scope.id, { status: 'proposed', proposed_at: deps.clock.now() })
    if (row.status === 'briefed') await setEngagementStatus(tx, row.id, 'scoped')
    await mailProposal(tx, deps, actor, row, scope)
    return ok({ engagementId: row.id, version: scope.version })
  }),
)

/** The purchaser agrees: from now on hours may be posted up to this cap. The version in force before is superseded. */
export const approveScope = operation('engagements.approveScope', scopeIdSchema, async (deps, actor, input) =>
  withTx(deps.db, async (tx): Promise<Result<ScopeDecision, EngagementError | Denial>> => {
    const scope = await findScope(tx, input.scopeId)
    if (!scope) return err(notFound)
    const engagement = await engagementFor(tx, actor, 'scope.decide', scope.engagement_id)
    if (!engagement.ok) return engagement
    if (scope.status === 'draft') return err(notFound)
    if (scope.status !== 'proposed') return err(scopeNotOpen)
    const { row } = engagement.value
    await supersedeScopes(tx, row.id, 'approved')
    await updateScope(tx, scope.id, {
      status: 'approved',
      decided_by: actor.personId,
      decided_at: deps.clock.now(),
    })
    if (row.status !== 'closed') await setEngagementStatus(tx, row.id, 'active')
    return ok({ engagementId: row.id, version: scope.version })
  }),
)

/** The purchaser says no and why; the version in force, if there is one, stays in force. */
export const declineScope = operation(
  'engagements.declineScope',
  declineScopeSchema,
  async (deps, actor, input) =>
    withTx(deps.db, async (tx): Promise<Result<ScopeDecision, EngagementError | Denial>> => {
      const scope = await findScope(tx, input.scopeId)
      if (!scope) return err(notFound)
      const engagement = await engagementFor(tx, actor, 'scope.decide', scope.engagement_id)
      if (!engagement.ok) return engagement
      if (scope.status === 'draft') return err(notFound)
      if (scope.status !== 'proposed') return err(scopeNotOpen)
      await updateScope(tx, scope.id, {
        status: 'declined',
        decided_by: actor.personId,
        decided_at: deps.clock.now(),
        decision_note: input.note,
      })
      return ok({ engagementId: scope.engagement_id, version: scope.version })
    }),
)
