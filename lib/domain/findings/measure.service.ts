import 'server-only'

import { withTx } from '@/db/tx'
import { ringMeasurementMethod } from '@/lib/core/ring/ring-measurement-method'
import { err, ok } from '@/lib/core/result'
import { exactQuantityText } from '@/lib/core/units/exact-quantity-text'

import { engagementFor } from '../engagements/engagement-resource'
import { offeredCaptures } from '../evidence/capture-channel'
import { evidenceFor, loadCapture, type CaptureDto, type LoadedEvidence } from '../evidence/evidence-resource'
import { operation } from '../operation'
import { measureTrace } from './measure-trace'
import type { MeasuredTrace, RunInputs } from './run-record'
import { noSuchChannel, notACapture } from './runs.errors'
import { engagementIdSchema, measureRingSchema, type MeasureRing } from './runs.schema'
import { storeRun } from './store-run'

/** Measures the edge and the ring in one channel of a capture and keeps the run. "No ring" is an answer as well. */
export const measureRing = operation('runs.measureRing', measureRingSchema, async (deps, actor, input) => {
  const evidence = await evidenceFor(deps.db, actor, 'run.create', input.evidenceId)
  if (!evidence.ok) return evidence
  const capture = await loadCapture(deps.db, input.evidenceId)
  if (!capture) return err(notACapture)
  const trace = traceOf(evidence.value, capture, input.channel)
  if (!trace) return err(noSuchChannel)
  const outcome = await measureTrace(deps.files, trace, capture, input)
  if (!outcome.ok) return outcome
  const run = {
    engagementId: evidence.value.row.engagement_id,
    methodId: ringMeasurementMethod.id,
    methodVersion: ringMeasurementMethod.version,
    inputs: { trace, values: windowOf(input), tolerances: {} },
    outcome: outcome.value,
    evidence: [{ evidenceId: trace.evidenceId, sha256: trace.sha256 }],
  }
  return ok(await withTx(deps.db, (tx) => storeRun(tx, deps, actor, run)))
})

/** The captures of an engagement with their channels: what the bench can measure. */
export const listTraces = operation('runs.listTraces', engagementIdSchema, async (deps, actor, input) => {
  const engagement = await engagementFor(deps.db, actor, 'run.create', input.engagementId)
  if (!engagement.ok) return engagement
  return ok(await offeredCaptures(deps.db, input.engagementId))
})

function traceOf({ row }: LoadedEvidence, capture: CaptureDto, position: number): MeasuredTrace | undefined {
  const channel = capture.channels.find((candidate) => candidate.position === position)
  if (!channel) return undefined
  const unit = channel.unit === 'V' || channel.unit === 'A' ? channel.unit : ''
  return {
    evidenceId: row.id,
    evidenceNumber: row.number,
    evidenceName: row.name,
    sha256: row.sha256,
    channel: { position, name: channel.name, unit },
    facts: capture.facts,
  }
}

function windowOf({ from, to }: MeasureRing): RunInputs['values'] {
  const values: RunInputs['values'] = {}
  for (const [key, value] of Object.entries({ from, to })) {
    if (value !== null) values[key] = { by: 'typed', value, text: exactQuantityText(value, 's') }
  }
  return values
}
