import { z } from 'zod'

import type { Figure } from '@/lib/core/figure/figure'
import { units } from '@/lib/core/units/unit'

/** What a run keeps as JSON. The zod schemas read the rows back; the types are made of them. */
const unit = z.enum(units)

/** A number, the key of a choice, or rows. */
const plainValue = z.union([
  z.number(),
  z.string(),
  z.array(z.record(z.string(), z.union([z.number(), z.string()]))).readonly(),
])

const typedValue = z.object({
  by: z.literal('typed'),
  value: plainValue,
  text: z.string(),
})

const pickedValue = z.object({
  by: z.literal('run'),
  value: z.number(),
  runId: z.string(),
  runNumber: z.int(),
  runTitle: z.string(),
  resultKey: z.string(),
  resultLabel: z.string(),
  resultSymbol: z.string(),
})

const inputValue = z.discriminatedUnion('by', [typedValue, pickedValue])

/** Measurement facts as they were stated when the capture was measured. */
const captureFacts = z.object({
  bandwidthHertz: z.number().nullable(),
  probeAttenuation: z.number().nullable(),
  probeCapacitanceFarads: z.number().nullable(),
  groundMethod: z.enum(['spring', 'lead', 'coaxial', 'differential']).nullable(),
  groundLeadMetres: z.number().nullable(),
  probedAt: z.string().nullable(),
  operatingCondition: z.string().nullable(),
})

const measuredTrace = z.object({
  evidenceId: z.string(),
  evidenceNumber: z.int(),
  evidenceName: z.string(),
  sha256: z.string(),
  channel: z.object({ position: z.int(), name: z.string(), unit: z.enum(['V', 'A', '']) }),
  facts: captureFacts,
})

const statedTolerance = z.object({
  halfWidth: z.number(),
  distribution: z.enum(['rectangular', 'normal']),
  text: z.string(),
})

const runInputs = z.object({
  /** The trace that was measured; null for a run on values alone. */
  trace: measuredTrace.nullable(),
  values: z.record(z.string(), inputValue),
  /** Of any value, one that the method proposed as well. */
  tolerances: z.record(z.string(), statedTolerance).default({}),
})

const resultValue = z.object({
  key: z.string(),
  label: z.string(),
  symbol: z.string(),
  unit,
  value: z.number(),
  role: z.enum(['main', 'intermediate']),
})

const uncertainty = z.object({
  coverage: z.number(),
  draws: z.int(),
  seed: z.int(),
  intervals: z.array(
    z.object({
      key: z.string(),
      low: z.number(),
      high: z.number(),
      dominant: z.object({ input: z.string(), share: z.number() }).nullable(),
    }),
  ),
})

const runResult = z.object({
  /** The answer in words where there is no number to give, such as "no ring was found". */
  absence: z.string().nullable(),
  results: z.array(resultValue),
  choices: z.array(
    z.object({
      title: z.string(),
      columns: z.array(z.object({ label: z.string(), unit: z.enum([...units, 'text']) })),
      rows: z.array(z.array(z.union([z.number(), z.string()]))),
    }),
  ),
  validity: z.array(z.object({ passed: z.boolean(), sentence: z.string() })),
  warnings: z.array(z.string()),
  /** The intervals of the results; null where no tolerance was given. */
  uncertainty: uncertainty.nullable().default(null),
})

const axis = z.object({
  label: z.string(),
  unit: z.string(),
  scale: z.enum(['linear', 'log']),
  range: z.exactOptional(z.tuple([z.number(), z.number()])),
})

const mark = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('level'), y: z.number(), label: z.string() }),
  z.object({ kind: z.literal('instant'), x: z.number(), label: z.string() }),
  z.object({ kind: z.literal('point'), x: z.number(), y: z.number(), label: z.string() }),
])

const series = z.object({
  id: z.string(),
  label: z.string(),
  role: z.enum(['measured', 'computed', 'reference', 'limit']),
  x: z.array(z.number()),
  y: z.array(z.number()),
})

const runFigures = z.array(
  z.object({
    id: z.string(),
    title: z.string(),
    description: z.string(),
    x: axis,
    y: axis,
    series: z.array(series),
    marks: z.array(mark),
  }),
)

export type MeasuredTrace = z.output<typeof measuredTrace>
export type InputValue = z.output<typeof inputValue>
export type RunInputs = z.output<typeof runInputs>
export type RunResult = z.output<typeof runResult>
export type RunFigures = z.output<typeof runFigures>

/** All that a run gives: the numbers and checks, and the figures drawn from them. */
export type RunOutcome = RunResult & { readonly figures: RunFigures }

export const parseInputs = (text: string): RunInputs => runInputs.parse(JSON.parse(text))
export const parseResult = (text: string): RunResult => runResult.parse(JSON.parse(text))
export const parseFigures = (text: string): RunFigures => runFigures.parse(JSON.parse(text))

/** A result with its figures as they read back from their row, so that fresh and stored ones compare equal. */
export const asStored = (result: RunResult, figures: readonly Figure[]): RunOutcome => ({
  ...parseResult(JSON.stringify(result)),
  figures: parseFigures(JSON.stringify(figures)),
})
