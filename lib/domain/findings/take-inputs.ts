import 'server-only'

import type { Db } from '@/db/client'
import { findRun, listRunEvidence } from '@/db/repositories/method-run.repo'
import { ok, type Result } from '@/lib/core/result'
import type { RegisteredMethod } from '@/lib/core/method/registry'
import { isQuantity, type RawInput } from '@/lib/core/method/input-definition'

import { runTitleOf } from './run-dto'
import { parseInputs, parseResult, type InputValue } from './run-record'
import type { GivenInput } from './runs.schema'
import type { RunEvidence } from './store-run'

type Picked = Extract<InputValue, { by: 'run' }>

/** The inputs of a method as they go into it, with what was picked from earlier runs. */
export type TakenInputs = {
  readonly raw: Readonly<Record<string, RawInput>>
  readonly texts: Readonly<Record<string, string>>
  readonly tolerances: Readonly<Record<string, string>>
  readonly picked: Readonly<Record<string, Picked>>
  readonly evidence: readonly RunEvidence[]
}

/**
 * Reads picked values from the stored runs of this engagement, with the evidence they rest on.
 * A run of another engagement is refused exactly as one that does not exist.
 */
export async function takeInputs(
  db: Db,
  engagementId: string,
  method: RegisteredMethod,
  given: Readonly<Record<string, GivenInput>>,
): Promise<Result<TakenInputs, Readonly<Record<string, string>>>> {
  const raw: Record<string, RawInput> = {}
  const texts: Record<string, string> = {}
  const tolerances: Record<string, string> = {}
  const picked: Record<string, Picked> = {}
  const refused: Record<string, string> = {}
  for (const [key, input] of Object.entries(given)) {
    if (input.tolerance.trim() !== '') tolerances[key] = input.tolerance.trim()
    if ('text' in input) {
      raw[key] = texts[key] = input.text.trim()
      continue
    }
    const definition = method.inputs[key]
    const unit = definition && isQuantity(definition) ? definition.unit : undefined
    const found = await pickedValue(db, engagementId, input, unit)
    if (typeof found === 'string') refused[key] = found
    else raw[key] = (picked[key] = found).value
  }
  if (Object.keys(refused).length > 0) return { ok: false, error: refused }
  const runIds = [...new Set(Object.values(picked).map((value) => value.runId))]
  return ok({ raw, texts, tolerances, picked, evidence: await evidenceOf(db, runIds) })
}

async function pickedValue(
  db: Db,
  engagementId: string,
  { fromRun, key }: Extract<GivenInput, { fromRun: string }>,
  unit: string | undefined,
): Promise<Picked | string> {
  const run = await findRun(db, fromRun)
  if (!run || run.engagement_id !== engagementId)
    return 'This run is not one of this engagement. Choose another.'
  const result = parseResult(run.result).results.find((candidate) => candidate.key === key)
  if (!result) return `Run ${run.number} has no such result. Choose another.`
  if (result.unit !== unit) {
    return `${result.label} of run ${run.number} is not of the quantity that is wanted here. Choose another.`
  }
  return {
    by: 'run',
    value: result.value,
    runId: run.id,
    runNumber: run.number,
    runTitle: runTitleOf(run.method_id, parseInputs(run.inputs)),
    resultKey: result.key,
    resultLabel: result.label,
    resultSymbol: result.symbol,
  }
}

/** Each piece of evidence once. */
async function evidenceOf(db: Db, runIds: readonly string[]): Promise<readonly RunEvidence[]> {
  const rows = await listRunEvidence(db, runIds)
  const byId = new Map(rows.map(({ evidence_id, sha256 }) => [evidence_id, sha256]))
  return [...byId].map(([evidenceId, sha256]) => ({ evidenceId, sha256 }))
}
