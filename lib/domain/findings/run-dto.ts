import 'server-only'

import type { RunEvidenceRow, RunListRow, RunRow } from '@/db/repositories/method-run.repo'
import type { Figure } from '@/lib/core/figure/figure'
import type { ChoiceTable, ResultValue, ValidityCheck } from '@/lib/core/method/method'
import { isQuantity, type InputDefinition, type PlainValue } from '@/lib/core/method/input-definition'
import { writtenValue } from '@/lib/core/method/written-value'
import { formatQuantity } from '@/lib/core/units/format-quantity'
import type { ResultInterval } from '@/lib/core/uncertainty/propagate'

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
  /** In the SI unit, the key of a choice, or rows. */
  readonly value: PlainValue
  /** For the eye, number and unit apart where there is one number. */
  readonly written: { readonly number: string; readonly unit: string }
  /** As it was stated, such as "5 %"; null where nothing was said. */
  readonly tolerance: string | null
  /** Where the value comes from, as a sentence without its full stop. */
  readonly origin: string
  /** The run that it was taken from; null for a value that was typed. */
  readonly fromRunId: string | null
}

/** A result with its 95 % interval, in the SI unit, where tolerances were given. */
export type RunValueDto = ResultValue & { readonly interval: ResultInterval | null }

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
  readonly results: readonly RunValueDto[]
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
  const { absence, results, uncertainty } = parseResult(row.result)
  const intervals = new Map(uncertainty?.intervals.map((interval) => [interval.key, interval]))
  return {
    runId: row.id,
    engagementId: row.engagement_id,
    number: row.number,
    title: runTitleOf(row.method_id, parseInputs(row.inputs)),
    methodId: row.method_id,
    createdBy: row.creator,
    createdAt: row.created_at,
    absence,
    results: results.map((result) => ({ ...result, interval: intervals.get(result.key) ?? null })),
  }
}

export function runOf(row: RunRow, evidence: readonly RunEvidenceRow[]): RunDto {
  const inputs = parseInputs(row.inputs)
  const { results, choices, validity, warnings } = parseResult(row.result)
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
    inputs: inputsOf(inputs, results, definition, row.creator),
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

function inputsOf(
  { values, tolerances }: RunInputs,
  results: readonly ResultValue[],
  definition: MethodDefinition,
  creator: string,
): RunInputDto[] {
  const inputOf = (
    key: string,
    value: PlainValue,
    origin: string,
    fromRunId: string | null,
  ): RunInputDto => ({
    key,
    label: definition.inputs[key]?.label ?? key,
    symbol: definition.inputs[key]?.symbol ?? '',
    value,
    written: writtenParts(definition.inputs[key], value, fromRunId !== null),
    tolerance: tolerances[key]?.text ?? null,
    origin,
    fromRunId,
  })
  const given = Object.entries(values).map(([key, input]) => {
    const origin = originOf(input, definition.inputs[key], creator)
    return inputOf(key, input.value, origin, input.by === 'run' ? input.runId : null)
  })
  const proposed = results.filter(({ key }) => Object.hasOwn(tolerances, key) && !Object.hasOwn(values, key))
  return [...given, ...proposed.map(({ key, value }) => inputOf(key, value, 'Proposed by the method', null))]
}

/** A typed value with the digits that it was typed with; a computed one with enough to be recognised. */
function writtenParts(definition: InputDefinition | undefined, value: PlainValue, isComputed: boolean) {
  if (!definition || !isQuantity(definition)) {
    return { number: definition ? writtenValue(definition, value) : String(value), unit: '' }
  }
  if (isComputed) return formatQuantity(Number(value), definition.unit, 5)
  const [number = '', unit = ''] = writtenValue(definition, value).split('\u00a0')
  return { number, unit }
}

function originOf(input: InputValue, definition: InputDefinition | undefined, creator: string): string {
  if (input.by === 'run') {
    return `${input.resultLabel} ${input.resultSymbol} of run ${input.runNumber}, ${input.runTitle}`
  }
  if (!definition || !isQuantity(definition)) return `Entered by ${creator}`
  const exact = writtenValue(definition, input.value)
  return `Typed by ${creator} as “${input.text}”${exact === input.text ? '' : `, that is ${exact}`}`
}
