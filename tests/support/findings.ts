import type { Actor } from '@/lib/authz/actor'
import { stateFacts } from '@/lib/domain/evidence/evidence.service'
import { receiveEvidence } from '@/lib/domain/evidence/upload.service'
import { measureRing } from '@/lib/domain/findings/measure.service'
import { getRun, runMethod } from '@/lib/domain/findings/run.service'
import type { RunDto } from '@/lib/domain/findings/run-dto'

import { captureBytes } from '../reference/reference-captures'
import type { TestEngagement } from './engagement'
import { streamOf } from './sample-files'
import type { TestPortal } from './test-portal'
import { valueOf } from './value-of'

/** Sends one of the reference captures in as the engineer of the engagement. */
export async function sendReferenceCapture(
  portal: TestPortal,
  engagement: TestEngagement,
  file: string,
): Promise<string> {
  const bytes = captureBytes(file)
  const sent = await receiveEvidence.execute(portal.deps, engagement.engineer, {
    engagementId: engagement.engagementId,
    name: file,
    contentLength: bytes.byteLength,
    body: streamOf(bytes),
  })
  return valueOf(sent).evidenceId
}

/** States how a capture was measured, with a 1 GHz system and a spring at the probe. */
export async function stateGoodFacts(
  portal: TestPortal,
  engagement: TestEngagement,
  evidenceId: string,
): Promise<void> {
  valueOf(
    await stateFacts.execute(portal.deps, engagement.engineer, {
      evidenceId,
      bandwidthHertz: '1 GHz',
      probeAttenuation: '10',
      probeCapacitanceFarads: '1 pF',
      groundMethod: 'spring',
      groundLeadMetres: '',
      probedAt: 'SW pin to source of Q2',
      operatingCondition: '48 V in, 2.5 A out',
    }),
  )
}

export async function measureCapture(
  portal: TestPortal,
  engagement: TestEngagement,
  evidenceId: string,
  window: { readonly from?: string; readonly to?: string } = {},
): Promise<string> {
  const run = await measureRing.execute(portal.deps, engagement.consultant, {
    evidenceId,
    channel: '0',
    ...window,
  })
  return valueOf(run).runId
}

/** Both reference captures measured, and the parasitics that follow from the two rings and the added 470 pF. */
export async function runParasitics(portal: TestPortal, engagement: TestEngagement) {
  const bareId = await sendReferenceCapture(portal, engagement, 'o01_bare.csv')
  const loadedId = await sendReferenceCapture(portal, engagement, 'o02_with_cadd_470pF.csv')
  const bareRunId = await measureCapture(portal, engagement, bareId)
  const loadedRunId = await measureCapture(portal, engagement, loadedId)
  const run = await runMethod.execute(portal.deps, engagement.consultant, {
    engagementId: engagement.engagementId,
    methodId: 'ring-parasitics',
    inputs: {
      f0: { fromRun: bareRunId, key: 'dampedFrequency' },
      zeta0: { fromRun: bareRunId, key: 'dampingRatio' },
      f1: { fromRun: loadedRunId, key: 'dampedFrequency' },
      zeta1: { fromRun: loadedRunId, key: 'dampingRatio' },
      cAdd: { text: '470p' },
    },
  })
  return { bareId, loadedId, bareRunId, loadedRunId, runId: valueOf(run).runId }
}

export const readRun = async (portal: TestPortal, actor: Actor, runId: string): Promise<RunDto> =>
  valueOf(await getRun.execute(portal.deps, actor, { runId }))

export function resultOf(run: RunDto, key: string): number {
  const result = run.results.find((candidate) => candidate.key === key)
  if (!result) throw new Error(`Run ${run.number} has no result ${key}`)
  return result.value
}
