import 'server-only'

import { listRunsOf } from '@/db/repositories/method-run.repo'
import { withTx } from '@/db/tx'
import { notFound } from '@/lib/authz/authorize'
import { findMethod } from '@/lib/core/method/registry'
import { toleranceField } from '@/lib/core/method/read-tolerances'
import type { MethodRun } from '@/lib/core/method/run-method'
import { err, ok } from '@/lib/core/result'

import { engagementFor } from '../engagements/engagement-resource'
import { operation } from '../operation'
import { methodHeadings } from './method-headings'
import { outcomeOf } from './method-outcome'
import { methodDefinition } from './run-definition'
import { runHeadingOf } from './run-dto'
import type { RunInputs } from './run-record'
import { loadRun, readableRun } from './run-resource'
import { inputsRefused, noSuchMethod } from './runs.errors'
import { engagementIdSchema, openMethodSchema, runIdSchema, runMethodSchema } from './runs.schema'
import { storeRun } from './store-run'
import { takeInputs, type TakenInputs } from './take-inputs'

/** Runs a method on typed values and on results of earlier runs, and keeps inputs, origins and all results. */
export const runMethod = operation('runs.runMethod', runMethodSchema, async (deps, actor, input) => {
  const engagement = await engagementFor(deps.db, actor, 'run.create', input.engagementId)
  if (!engagement.ok) return engagement
  const method = findMethod(input.methodId)
  if (!method) return err(noSuchMethod)
  const taken = await takeInputs(deps.db, input.engagementId, method, input.inputs)
  if (!taken.ok)
    return err(
      inputsRefused(
        someInputs,
        inForm(taken.error, () => 'pick'),
      ),
    )
  const { raw, tolerances, picked, evidence } = taken.value
  const run = method.run(raw, tolerances)
  if (!run.ok) {
    const fields = inForm(run.error.fields, (key) => (picked[key] ? 'pick' : 'text'))
    return err(inputsRefused(run.error, fields))
  }
  const stored = {
    engagementId: input.engagementId,
    methodId: method.id,
    methodVersion: method.version,
    inputs: inputsOf(run.value, taken.value),
    outcome: outcomeOf(run.value),
    evidence,
  }
  return ok(await withTx(deps.db, (tx) => storeRun(tx, deps, actor, stored)))
})

/** The runs of an engagement, newest first, with their results. */
export const listRuns = operation('runs.list', engagementIdSchema, async (deps, actor, input) => {
  const engagement = await engagementFor(deps.db, actor, 'run.read', input.engagementId)
  if (!engagement.ok) return engagement
  const rows = await listRunsOf(deps.db, input.engagementId)
  return ok(rows.map(runHeadingOf))
})

/** One run with everything behind its numbers. */
export const getRun = operation('runs.get', runIdSchema, async (deps, actor, input) => {
  const run = await readableRun(deps.db, actor, input.runId)
  return run.ok ? ok(await loadRun(deps.db, run.value.row)) : run
})

/** The methods that the bench offers. */
export const listMethods = operation('runs.listMethods', engagementIdSchema, async (deps, actor, input) => {
  const engagement = await engagementFor(deps.db, actor, 'run.create', input.engagementId)
  if (!engagement.ok) return engagement
  return ok(methodHeadings())
})

/** The definition that the form of a method is made from. */
export const getMethod = operation('runs.getMethod', openMethodSchema, async (deps, actor, input) => {
  const engagement = await engagementFor(deps.db, actor, 'run.create', input.engagementId)
  if (!engagement.ok) return engagement
  const definition = methodDefinition(input.methodId)
  return definition ? ok(definition) : err(notFound)
})

const someInputs = { code: 'invalid_input', message: 'Some inputs need another look.', fields: {} } as const

const inputsOf = (run: MethodRun, { picked, texts, tolerances }: TakenInputs): RunInputs => ({
  trace: null,
  values: mapValues(
    run.values,
    (value, key) => picked[key] ?? { by: 'typed', value, text: texts[key] ?? '' },
  ),
  tolerances: mapValues(run.tolerances, (tolerance, key) => ({ ...tolerance, text: tolerances[key] ?? '' })),
})

/** A method names inputs and, as "tolerances.key", their tolerances; a form has both under "inputs.key". */
function inForm(
  refused: Readonly<Record<string, string>>,
  entryOf: (key: string) => 'pick' | 'text',
): Readonly<Record<string, string>> {
  const prefix = toleranceField('')
  const named = Object.entries(refused).map(([field, sentence]) => {
    const key = field.startsWith(prefix) ? field.slice(prefix.length) : field
    return [`inputs.${key}.${key === field ? entryOf(key) : 'tolerance'}`, sentence]
  })
  return Object.fromEntries(named)
}

const mapValues = <From, To>(
  record: Readonly<Record<string, From>>,
  change: (value: From, key: string) => To,
): Record<string, To> =>
  Object.fromEntries(Object.entries(record).map(([key, value]) => [key, change(value, key)]))
