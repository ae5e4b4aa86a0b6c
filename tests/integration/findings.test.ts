import { afterEach, beforeEach, describe, expect, it } from 'vitest'

import type { Actor } from '@/lib/authz/actor'
import { listTraces, measureRing } from '@/lib/domain/findings/measure.service'
import { getFinding, listFindings } from '@/lib/domain/findings/finding-reading.service'
import { createFinding, editFinding, publishFinding } from '@/lib/domain/findings/finding.service'
import { publishedFindings } from '@/lib/domain/findings/published-findings'
import { recomputeRun } from '@/lib/domain/findings/recompute.service'
import { getMethod, getRun, listMethods, listRuns, runMethod } from '@/lib/domain/findings/run.service'

import { approveTestScope, openTestEngagement, type TestEngagement } from '../support/engagement'
import { runParasitics } from '../support/findings'
import { addPerson } from '../support/people'
import { openTestPortal, type TestPortal } from '../support/test-portal'
import { valueOf } from '../support/value-of'

let portal: TestPortal
let osterby: TestEngagement

beforeEach(async () => {
  portal = await openTestPortal()
  osterby = await openTestEngagement(portal)
})

afterEach(() => portal.close())

const draftWord = 'canary-of-the-draft'

const content = (runIds: readonly string[]) => ({
  claim: `The hot loop rings: 8 nH with 300 pF, ${draftWord}`,
  severity: 'major',
  confidence: 'high',
  reasoning: 'Two frequencies with and without a known capacitor.',
  alternativeCauses: 'The ring of a ground lead.',
  disprovingExperiment: 'Move the input capacitor closer: the ring must rise.',
  runIds,
  actions: [
    { instruction: 'Fit an RC snubber across Q2', partValues: '1 nF, 4.7 Ω', sideEffects: '90 mW more loss' },
    { instruction: '', partValues: '', sideEffects: '' },
  ],
})

async function create(runIds: readonly string[], more: Record<string, unknown> = {}) {
  return createFinding.execute(portal.deps, osterby.consultant, {
    engagementId: osterby.engagementId,
    ...content(runIds),
    ...more,
  })
}

const publish = (findingId: string, actor: Actor = osterby.consultant) =>
  publishFinding.execute(portal.deps, actor, { findingId })
const read = (findingId: string, actor: Actor = osterby.consultant) =>
  getFinding.execute(portal.deps, actor, { findingId })

async function publishedFinding() {
  const runs = await runParasitics(portal, osterby)
  const { findingId } = valueOf(await create([runs.bareRunId, runs.loadedRunId, runs.runId]))
  await approveTestScope(portal, osterby)
  valueOf(await publish(findingId))
  return { findingId, ...runs }
}

describe('a draft', () => {
  it('keeps its runs in their order and its actions, and can be changed until it is published', async () => {
    const { runId, bareRunId } = await runParasitics(portal, osterby)
    const { findingId } = valueOf(await create([runId, bareRunId]))
    expect(valueOf(await read(findingId))).toMatchObject({
      number: 1,
      status: 'draft',
      runs: [{ runId }, { runId: bareRunId }],
      actions: [{ instruction: 'Fit an RC snubber across Q2', partValues: '1 nF, 4.7 Ω' }],
    })
    const changed = await editFinding.execute(portal.deps, osterby.consultant, {
      findingId,
      ...content([bareRunId]),
      claim: 'Another claim',
    })
    valueOf(changed)
    expect(valueOf(await read(findingId))).toMatchObject({
      claim: 'Another claim',
      runs: [{ runId: bareRunId }],
    })
  })

  it('refuses runs of another engagement as it refuses unknown ones', async () => {
    const larkfield = await openTestEngagement(portal, 'Larkfield Rail Sensors')
    const foreign = await runParasitics(portal, larkfield)
    const answer = await create([foreign.runId])
    expect(answer).toMatchObject({ error: { code: 'run_not_here', fields: { runIds: expect.any(String) } } })
    expect(answer).toEqual(await create([portal.deps.ids.newId()]))
  })

  it('is refused with a sentence for each entry that is missing or too much', async () => {
    expect(await create([], { claim: ' ', severity: '', actions: [{ partValues: '1 nF' }] })).toMatchObject({
      error: {
        fields: {
          claim: expect.any(String),
          severity: expect.any(String),
          'actions.0.instruction': expect.any(String),
        },
      },
    })
    expect(await create([], { status: 'published' })).toMatchObject({ error: { code: 'invalid_input' } })
  })

  it('AZ4: never reaches a client, in a list, in a getter, or beside a published finding', async () => {
    const { findingId, runId } = await publishedFinding()
    const draft = valueOf(
      await create([runId], { claim: 'secret-draft-claim', reasoning: 'secret-reasoning' }),
    )
    for (const client of [osterby.engineer, osterby.purchaser]) {
      const answers = [
        await listFindings.execute(portal.deps, client, { engagementId: osterby.engagementId }),
        await read(findingId, client),
        await read(draft.findingId, client),
        await publish(draft.findingId, client),
        await editFinding.execute(portal.deps, client, { findingId: draft.findingId, ...content([runId]) }),
      ]
      expect(JSON.stringify(answers)).not.toMatch(/secret-/u)
      expect(JSON.stringify(answers[0])).toContain(draftWord)
      expect(answers[2]).toEqual(await read(portal.deps.ids.newId(), client))
      expect(answers[3]).toEqual(answers[2])
      expect(answers[4]).toEqual(answers[2])
    }
    expect(JSON.stringify(await publishedFindings(portal.db, osterby.engagementId))).not.toMatch(/secret-/u)
  })
})

describe('publishing', () => {
  it('needs an approved scope', async () => {
    const { runId } = await runParasitics(portal, osterby)
    const { findingId } = valueOf(await create([runId]))
    expect(await publish(findingId)).toMatchObject({ error: { code: 'no_approved_scope' } })
    await approveTestScope(portal, osterby)
    valueOf(await publish(findingId))
  })

  it('needs at least one run, and what a reader needs to doubt the claim', async () => {
    await approveTestScope(portal, osterby)
    const { findingId } = valueOf(await create([]))
    expect(await publish(findingId)).toMatchObject({ error: { code: 'no_run' } })
    const { runId } = await runParasitics(portal, osterby)
    const bare = valueOf(await create([runId], { alternativeCauses: '', disprovingExperiment: '' }))
    expect(await publish(bare.findingId)).toMatchObject({
      error: { code: 'not_complete', fields: { disprovingExperiment: expect.any(String) } },
    })
  })

  it('happens once, and then nothing of the finding changes any more', async () => {
    const { findingId, runId } = await publishedFinding()
    expect(await publish(findingId)).toMatchObject({ error: { code: 'already_published' } })
    const edit = await editFinding.execute(portal.deps, osterby.consultant, {
      findingId,
      ...content([runId]),
    })
    expect(edit).toMatchObject({ error: { code: 'already_published' } })
    const rows = [
      portal.db.updateTable('finding').set({ claim: 'x' }).where('id', '=', findingId),
      portal.db.deleteFrom('finding_run').where('finding_id', '=', findingId),
      portal.db.deleteFrom('finding_action').where('finding_id', '=', findingId),
    ]
    for (const row of rows) await expect(row.execute()).rejects.toThrow('never edited')
  })

  it('gives the client every number with formula, source, inputs and hashes, and lets them recompute', async () => {
    const { findingId, runId } = await publishedFinding()
    const finding = valueOf(await read(findingId, osterby.engineer))
    expect(finding.mayWrite).toBe(false)
    expect(finding.runs).toHaveLength(3)
    for (const run of finding.runs) {
      expect(run.definition.formulas.length).toBeGreaterThan(0)
      expect(run.definition.sources.length).toBeGreaterThan(0)
      expect(run.evidence.length).toBeGreaterThan(0)
      const answer = await recomputeRun.execute(portal.deps, osterby.engineer, { runId: run.runId })
      expect(valueOf(answer).isSame).toBe(true)
    }
    expect(valueOf(await getRun.execute(portal.deps, osterby.engineer, { runId })).runId).toBe(runId)
    expect(await publishedFindings(portal.db, osterby.engagementId)).toMatchObject([{ findingId }])
  })

  it('leaves a run that stands in no published finding unknown to the client', async () => {
    const { bareRunId } = await runParasitics(portal, osterby)
    for (const operation of [getRun, recomputeRun]) {
      const answer = await operation.execute(portal.deps, osterby.engineer, { runId: bareRunId })
      const unknown = await operation.execute(portal.deps, osterby.engineer, {
        runId: portal.deps.ids.newId(),
      })
      expect(answer).toEqual(unknown)
    }
  })
})

describe('AZ2: to somebody who is not on the engagement', () => {
  it('every operation answers as for an unknown id', async () => {
    const { findingId, runId, bareId } = await publishedFinding()
    const larkfield = await openTestEngagement(portal, 'Larkfield Rail Sensors')
    const unassigned = await addPerson(portal, { name: 'Unassigned Consultant', isConsultant: true })
    const unknown = portal.deps.ids.newId()
    const answers = async (
      actor: Actor,
      ids: Record<'engagement' | 'evidence' | 'run' | 'finding', string>,
    ) => {
      const engagementId = ids.engagement
      const ask = [
        measureRing.execute(portal.deps, actor, { evidenceId: ids.evidence, channel: '0' }),
        listTraces.execute(portal.deps, actor, { engagementId }),
        runMethod.execute(portal.deps, actor, { engagementId, methodId: 'ring-parasitics', inputs: {} }),
        listMethods.execute(portal.deps, actor, { engagementId }),
        getMethod.execute(portal.deps, actor, { engagementId, methodId: 'ring-parasitics' }),
        listRuns.execute(portal.deps, actor, { engagementId }),
        getRun.execute(portal.deps, actor, { runId: ids.run }),
        recomputeRun.execute(portal.deps, actor, { runId: ids.run }),
        createFinding.execute(portal.deps, actor, { engagementId, ...content([]) }),
        editFinding.execute(portal.deps, actor, { findingId: ids.finding, ...content([]) }),
        publish(ids.finding, actor),
        listFindings.execute(portal.deps, actor, { engagementId }),
        read(ids.finding, actor),
      ]
      return Promise.all(ask)
    }
    const real = { engagement: osterby.engagementId, evidence: bareId, run: runId, finding: findingId }
    const none = { engagement: unknown, evidence: unknown, run: unknown, finding: unknown }
    for (const actor of [larkfield.purchaser, larkfield.engineer, larkfield.consultant, unassigned]) {
      const foreign = await answers(actor, real)
      expect(foreign).toEqual(await answers(actor, none))
      expect(foreign.every((answer) => !answer.ok && answer.error.code === 'not_found')).toBe(true)
    }
  })

  it('and the client’s people can neither compute nor write, as their role does not include it', async () => {
    const { findingId, bareId } = await publishedFinding()
    const { engagementId, engineer, administrator } = osterby
    for (const actor of [engineer, administrator]) {
      const refused = [
        await measureRing.execute(portal.deps, actor, { evidenceId: bareId, channel: '0' }),
        await runMethod.execute(portal.deps, actor, {
          engagementId,
          methodId: 'ring-parasitics',
          inputs: {},
        }),
        await listRuns.execute(portal.deps, actor, { engagementId }),
        await createFinding.execute(portal.deps, actor, { engagementId, ...content([]) }),
        await publish(findingId, actor),
      ]
      for (const answer of refused) expect(answer).toMatchObject({ error: { code: 'not_permitted' } })
    }
    expect(await read(findingId, administrator)).toMatchObject({ error: { code: 'not_permitted' } })
  })
})
