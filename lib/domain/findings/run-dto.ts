import 'server-only'

import type { RunEvidenceRow, RunListRow, RunRow } from '@/db/repositories/method-run.repo'
import type { Figure } from '@/lib/core/figure/figure'
import type { ChoiceTable, ResultValue, ValidityCheck } from '@/lib/core/method/method'
import { exactQuantityText } from '@/lib/core/units/exact-quantity-text'
import type { Unit } from '@/lib/core/units/unit'

import { definitionOf, type MethodDefinition } from './run-definition'
import { parseFigures, parseInputs, parseResult, type InputValue, type RunInputs } from './run-record'

/** A piece of evidence that a run rests on, with the SHA-256 of its bytes at the time of the run. */
export type RunEvidenceDto = {
  readonly evidenceId: string
  readonly number: number
  readonly name: string
  readonly sha256: string
}

export type RunInputDto = {
  readonly key: string
  readonly label: string
  readonly symbol: string
  readonly unit: Unit
  /** In the SI unit. */
  readonly value: number
  /** Where the value comes from, as a sentence without its full stop. */
  readonly origin: string
  /** The run that it was taken from; null for a value that was typed. */
  readonly fromRunId: string | null
}

/** A run in a list. */
export type RunHeading = {
  readonly runId: string
  readonly engagementId: string
  readonly number: number
  readonly title: string
  readonly methodId: string
  readonly createdBy: string
  readonly createdAt: number
  readonly absence: string | null
  readonly results: readonly ResultValue[]
}

/** Everything that a run stores, with what its method says about it. */
export type RunDto = RunHeading & {
  readonly methodVersion: number
  readonly definition: MethodDefinition
  /** Name of the measured channel and the file it is in; null for a run on values alone. */
  readonly trace: {
    readonly channel: string
    readonly evidenceNumber: number
    readonly evidenceName: string
  } | null
  readonly inputs: readonly RunInputDto[]
  readonly choices: readonly ChoiceTable[]
  readonly validity: readonly ValidityCheck[]
  readonly warnings: readonly string[]
  readonly figures: readonly Figure[]
  readonly evidence: readonly RunEvidenceDto[]
}

export function runHeadingOf(row: RunListRow): RunHeading {
  const { absence, results } = parseResult(row.result)
  return {
    runId: row.id,
    engagementId: row.engagement_id,
    number: row.number,
    title: runTitleOf(row.method_id, parseInputs(row.inputs)),
    methodId: row.method_id,
    createdBy: row.creator,
    createdAt: row.created_at,
    absence,
    results,
  }
}

export function runOf(row: RunRow, evidence: readonly RunEvidenceRow[]): RunDto {
  const inputs = parseInputs(row.inputs)
  const { choices, validity, warnings } = parseResult(row.result)
  const definition = definitionOf(row.method_id)
  const { trace } = inputs
  return {
    ...runHeadingOf(row),
    methodVersion: row.method_version,
    definition,
    trace: trace && {
      channel: trace.channel.name,
      evidenceNumber: trace.evidenceNumber,
      evidenceName: trace.evidenceName,
    },
    inputs: Object.entries(inputs.values).map(([key, value]) => inputOf(key, value, definition, row.creator)),
    choices,
    validity,
    warnings,
    figures: parseFigures(row.figures).map((figure) => ({ ...figure, id: `${figure.id}-${row.number}` })),
    evidence: evidence
      .filter((piece) => piece.run_id === row.id)
      .map(({ evidence_id, number, name, sha256 }) => ({ evidenceId: evidence_id, number, name, sha256 })),
  }
}

/** "Ring of o01_bare.csv, SW", or the title of the method. */
export const runTitleOf = (methodId: string, { trace }: RunInputs): string =>
  trace ? `Ring of ${trace.evidenceName}, ${trace.channel.name}` : definitionOf(methodId).title

function inputOf(key: string, input: InputValue, definition: MethodDefinition, creator: string): RunInputDto {
  const known = definition.inputs[key]
  const unit = known?.unit ?? ''
  return {
    key,
    label: known?.label ?? key,
    symbol: known?.symbol ?? '',
    unit,
    value: input.value,
    origin: originOf(input, unit, creator),
    fromRunId: input.by === 'run' ? input.runId : null,
  }
}

const originOf = (input: InputValue, unit: Unit, creator: string): string =>
  input.by === 'run'
    ? `${input.resultLabel} ${input.resultSymbol} of run ${input.runNumber}, ${input.runTitle}`
    : `Typed by ${creator} as “${input.text}”${unit === '' ? '' : `, that is ${exactQuantityText(input.value, unit)}`}`
