import 'server-only'
import { createHash } from 'node:crypto'

import { findRun, type RunRow } from '@/db/repositories/method-run.repo'
import { findMethod } from '@/lib/core/method/registry'
import { ringMeasurementMethod } from '@/lib/core/ring/ring-measurement-method'
import { err, ok, type Result } from '@/lib/core/result'

import type { Deps } from '../deps'
import { firstDifference } from './first-difference'
import { measureTrace } from './measure-trace'
import { outcomeOf } from './method-outcome'
import { runTitleOf } from './run-dto'
import {
  parseFigures,
  parseInputs,
  parseResult,
  type InputValue,
  type MeasuredTrace,
  type RunInputs,
  type RunOutcome,
} from './run-record'

type RepeatDeps = Pick<Deps, 'db' | 'files' | 'captures'>

/**
 * Repeats a run from what is stored, down to the bytes of evidence: the runs that its inputs were taken from first,
 * then the run itself. Null when everything is the same to the last digit, else a sentence on the first difference.
 */
export async function differenceOnRepeat(deps: RepeatDeps, row: RunRow): Promise<string | null> {
  const inputs = parseInputs(row.inputs)
  return (await differenceInSources(deps, inputs)) ?? differenceInItself(deps, row, inputs)
}

async function differenceInSources(deps: RepeatDeps, { values }: RunInputs): Promise<string | null> {
  const sources = new Map<string, string | null>()
  for (const input of Object.values(values)) {
    if (input.by !== 'run') continue
    const source = await findRun(deps.db, input.runId)
    const taken = source && parseResult(source.result).results.find(({ key }) => key === input.resultKey)
    if (!source || taken?.value !== input.value) {
      return `${input.resultLabel} was taken from run ${input.runNumber} as ${input.value}; that run now holds ${taken?.value ?? 'nothing'}.`
    }
    if (!sources.has(source.id)) sources.set(source.id, await differenceOnRepeat(deps, source))
    const difference = sources.get(source.id) ?? null
    if (difference !== null) {
      return `Run ${source.number}, ${runTitleOf(source.method_id, parseInputs(source.inputs))}: ${difference}`
    }
  }
  return null
}

async function differenceInItself(deps: RepeatDeps, row: RunRow, inputs: RunInputs): Promise<string | null> {
  const version = inputs.trace ? ringMeasurementMethod.version : findMethod(row.method_id)?.version
  if (version !== row.method_version) {
    return `The run was made by version ${row.method_version} of its method; the portal now computes by version ${version ?? 'none'}.`
  }
  const repeated = inputs.trace
    ? await measureAgain(deps, inputs.trace, inputs.values)
    : computeAgain(row.method_id, inputs)
  if (!repeated.ok) return repeated.error
  const stored = { ...parseResult(row.result), figures: parseFigures(row.figures) }
  return firstDifference(stored, repeated.value)
}

function computeAgain(methodId: string, { values, tolerances }: RunInputs): Result<RunOutcome, string> {
  const raw = Object.fromEntries(Object.entries(values).map(([key, { value }]) => [key, value]))
  const run = findMethod(methodId)?.run(raw, tolerances)
  if (!run?.ok) return err(run?.error.message ?? 'The method is not known any more.')
  return ok(outcomeOf(run.value))
}

/** Reads the file again from its first byte; what was kept of an earlier reading is not trusted. */
async function measureAgain(
  deps: RepeatDeps,
  trace: MeasuredTrace,
  values: RunInputs['values'],
): Promise<Result<RunOutcome, string>> {
  const sha256 = await hashOf(deps.files.stream(trace.evidenceId))
  if (sha256 !== trace.sha256) {
    return err(
      `The bytes of ${trace.evidenceName} have changed: SHA-256 ${sha256}, at the time of the run ${trace.sha256}.`,
    )
  }
  const read = await deps.captures.analyse(trace.evidenceId)
  if (!read.ok) return err(read.error.message)
  const window = { from: instantOf(values['from']), to: instantOf(values['to']) }
  const measured = await measureTrace(deps.files, trace, read.value, window)
  return measured.ok ? measured : err(measured.error.message)
}

/** An end of the window, in seconds. */
const instantOf = (input: InputValue | undefined): number | null =>
  typeof input?.value === 'number' ? input.value : null

async function hashOf(body: ReadableStream<Uint8Array>): Promise<string> {
  const hash = createHash('sha256')
  const reader = body.getReader()
  for (let part = await reader.read(); !part.done; part = await reader.read()) hash.update(part.value)
  return hash.digest('hex')
}
