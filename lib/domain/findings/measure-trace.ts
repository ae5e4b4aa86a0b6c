import 'server-only'

import { measureRing } from '@/lib/core/ring/measure-ring'
import { ringFigure } from '@/lib/core/ring/ring-figure'
import { ringResults } from '@/lib/core/ring/ring-measurement-method'
import type { Trace } from '@/lib/core/ring/ring-measurement'
import { err, ok, type Result } from '@/lib/core/result'
import type { FileStore } from '@/lib/ports/file-store'

import { readSamples } from '../evidence/channel-samples'
import { measurementChecks, measurementWarnings } from './measurement-checks'
import type { MeasuredTrace, RunOutcome } from './run-record'
import { asStored } from './run-record'
import { nothingToMeasure, windowReversed, windowTooLong, type RunError } from './runs.errors'

/** So many samples are measured within the request: a fraction of a second. */
const mostSamples = 2_000_000

export type TimeBase = {
  readonly samples: number
  readonly startSeconds: number
  readonly intervalSeconds: number
}

export type Window = { readonly from: number | null; readonly to: number | null }

/** Measures one channel between two instants (seconds) by the stored samples and says what its facts rule out. */
export async function measureTrace(
  files: FileStore,
  trace: Pick<MeasuredTrace, 'evidenceId' | 'channel' | 'facts'>,
  base: TimeBase,
  window: Window,
): Promise<Result<RunOutcome, RunError>> {
  const range = rangeOf(base, window)
  if (!range.ok) return range
  const samples = await readPart(files, trace, base, range.value)
  const measured = measureRing(samples)
  if (!measured.ok) return err(nothingToMeasure(measured.error))
  const { facts, channel } = trace
  const outcome = {
    absence: measured.value.ringAbsence,
    results: [...ringResults(measured.value, channel.unit)],
    choices: [],
    validity: [...measurementChecks(measured.value, facts, base.intervalSeconds)],
    warnings: [...measurementWarnings(measured.value, facts, base.intervalSeconds)],
    uncertainty: null,
  }
  const figure = ringFigure(measured.value, samples, channel.unit)
  return ok(asStored(outcome, [figure]))
}

type Range = { readonly first: number; readonly count: number }

/** A part of a sample more or less is the rounding of the time that a person typed. */
const slack = 1e-6

function rangeOf(base: TimeBase, { from, to }: Window): Result<Range, RunError> {
  if (from !== null && to !== null && to <= from) return err(windowReversed)
  const indexOf = (instant: number) => (instant - base.startSeconds) / base.intervalSeconds
  const first = from === null ? 0 : Math.max(0, Math.ceil(indexOf(from) - slack))
  const last = to === null ? base.samples - 1 : Math.min(base.samples - 1, Math.floor(indexOf(to) + slack))
  const count = Math.max(0, last - first + 1)
  return count > mostSamples ? err(windowTooLong(count, mostSamples)) : ok({ first, count })
}

async function readPart(
  files: FileStore,
  { evidenceId, channel }: Pick<MeasuredTrace, 'evidenceId' | 'channel'>,
  { startSeconds, intervalSeconds }: TimeBase,
  { first, count }: Range,
): Promise<Trace> {
  const values = await readSamples(files, evidenceId, channel.position, first, count)
  return { values, startSeconds: startSeconds + first * intervalSeconds, intervalSeconds }
}
