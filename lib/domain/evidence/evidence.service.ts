import 'server-only'

import { listFacts, putFacts } from '@/db/repositories/evidence-facts.repo'
import { listEvidenceOf } from '@/db/repositories/evidence.repo'
import { withTx } from '@/db/tx'
import { err, ok } from '@/lib/core/result'

import { engagementFor } from '../engagements/engagement-resource'
import { operation } from '../operation'
import { pairsOf } from './capture-facts'
import { evidenceOf } from './evidence-dto'
import { evidenceFor, loadCapture } from './evidence-resource'
import { notACapture } from './evidence.errors'
import { engagementIdSchema, evidenceIdSchema, stateFactsSchema } from './evidence.schema'
import { consequencesOf } from './fact-consequences'

/** All evidence of an engagement, newest first, whoever sent it. */
export const listEvidence = operation(
  'evidence.listEvidence',
  engagementIdSchema,
  async (deps, actor, input) => {
    const engagement = await engagementFor(deps.db, actor, 'evidence.read', input.engagementId)
    if (!engagement.ok) return engagement
    const rows = await listEvidenceOf(deps.db, input.engagementId)
    return ok(rows.map(evidenceOf))
  },
)

/** One piece of evidence; for a capture its channels, the stated facts, and what each missing one rules out. */
export const getEvidence = operation('evidence.getEvidence', evidenceIdSchema, async (deps, actor, input) => {
  const evidence = await evidenceFor(deps.db, actor, 'evidence.read', input.evidenceId)
  if (!evidence.ok) return evidence
  const capture = await loadCapture(deps.db, input.evidenceId)
  if (!capture) return ok({ ...evidenceOf(evidence.value.row), capture: null })
  const statements = await listFacts(deps.db, input.evidenceId)
  const last = statements.reduce<(typeof statements)[number] | null>(
    (latest, fact) => (latest === null || fact.stated_at > latest.stated_at ? fact : latest),
    null,
  )
  return ok({
    ...evidenceOf(evidence.value.row),
    capture: {
      ...capture,
      consequences: consequencesOf(capture.facts, capture.intervalSeconds),
      lastStated: last === null ? null : { by: last.stater, at: last.stated_at },
    },
  })
})

/** Records how a capture was measured; an entry left empty takes the fact back. */
export const stateFacts = operation('evidence.stateFacts', stateFactsSchema, async (deps, actor, input) =>
  withTx(deps.db, async (tx) => {
    const { evidenceId, ...facts } = input
    const evidence = await evidenceFor(tx, actor, 'evidence.stateFacts', evidenceId)
    if (!evidence.ok) return evidence
    const capture = await loadCapture(tx, evidenceId)
    if (!capture) return err(notACapture)
    const groundLeadMetres = facts.groundMethod === 'lead' ? facts.groundLeadMetres : null
    const stated = { ...facts, groundLeadMetres }
    await putFacts(tx, evidenceId, pairsOf(stated), { by: actor.personId, at: deps.clock.now() })
    return ok(consequencesOf(stated, capture.intervalSeconds))
  }),
)

/** The bytes as they were sent in, to be served as an attachment only. */
export const openEvidenceFile = operation(
  'evidence.openEvidenceFile',
  evidenceIdSchema,
  async (deps, actor, input) => {
    const evidence = await evidenceFor(deps.db, actor, 'evidence.read', input.evidenceId)
    if (!evidence.ok) return evidence
    const { id, name, media_type, size_bytes } = evidence.value.row
    return ok({ name, mediaType: media_type, sizeBytes: size_bytes, body: deps.files.stream(id) })
  },
)
