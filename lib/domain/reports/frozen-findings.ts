import type { ReportFinding, ReportRun } from '@/lib/core/report/report-document'
import { formatQuantity } from '@/lib/core/units/format-quantity'
import type { Unit } from '@/lib/core/units/unit'

import type { FindingDto } from '../findings/finding-dto'
import type { RunDto } from '../findings/run-dto'

/** Every run that the findings rest on, once, in the order of its first use. */
export function orderedRuns(findings: readonly FindingDto[]): readonly RunDto[] {
  const runs = findings.flatMap((finding) => finding.runs)
  return [...new Map(runs.map((run) => [run.runId, run])).values()]
}

/** The numbers that the runs of a finding have within the document. */
export function frozenFinding(finding: FindingDto, runs: readonly RunDto[]): ReportFinding {
  const evidence = finding.runs.flatMap((run) => run.evidence.map((piece) => piece.number))
  return {
    number: finding.number,
    claim: finding.claim,
    severity: finding.severity,
    confidence: finding.confidence,
    reasoning: finding.reasoning,
    alternativeCauses: finding.alternativeCauses,
    disprovingExperiment: finding.disprovingExperiment,
    actions: finding.actions,
    runNumbers: finding.runs.map(({ runId }) => runs.findIndex((run) => run.runId === runId) + 1),
    evidenceNumbers: [...new Set(evidence)].sort((a, b) => a - b),
    figures: finding.runs.flatMap((run) => run.figures),
  }
}

/** A run as it is printed, numbered from 1 within the document. */
export function frozenRun(run: RunDto, index: number): ReportRun {
  const { definition } = run
  return {
    number: index + 1,
    title: run.title,
    methodId: run.methodId,
    methodVersion: run.methodVersion,
    formulas: definition.formulas,
    sources: definition.sources.map(({ citation, standing }) => `${citation} (${standing})`),
    inputs: run.inputs.map((input) => ({
      label: input.label,
      symbol: input.symbol,
      ...input.written,
      origin: input.origin,
    })),
    results: run.results.map((result) => ({
      ...printed(result.label, result.symbol, result.unit, result.value),
      isMain: result.role === 'main',
    })),
    validity: [
      ...run.validity,
      ...(run.absence === null ? [] : [{ passed: false, sentence: run.absence }]),
      ...run.warnings.map((sentence) => ({ passed: false, sentence })),
    ],
    notes: definition.notes,
    cautions: definition.cautions,
  }
}

const printed = (label: string, symbol: string, unit: Unit, value: number) => ({
  label,
  symbol,
  ...formatQuantity(value, unit),
})
