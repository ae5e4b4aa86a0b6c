import type { Figure } from '../figure/figure'

/**
 * A report as it is frozen for review and signing: everything that stands on its pages, and nothing that would have to
 * be looked up. Rendering it again gives the same bytes. Texts are ready to print; numbers inside figures are SI.
 */
export type ReportDocument = {
  readonly practice: { readonly name: string; readonly address: string }
  readonly number: string
  readonly revision: number
  readonly title: string
  /** UTC milliseconds of the moment at which the content was frozen. */
  readonly issuedAt: number
  readonly checkAddress: string
  readonly checkCode: string
  readonly clientCompany: string
  readonly engagement: ReportEngagement
  readonly summary: {
    readonly belief: string
    readonly certainty: string
    readonly nextStep: string
  }
  readonly evidence: readonly ReportEvidence[]
  readonly findings: readonly ReportFinding[]
  /** Every run that a finding rests on, once. */
  readonly runs: readonly ReportRun[]
  readonly minutesUsed: number
  readonly author: string
  readonly reviewer: string
  readonly revisions: readonly { readonly revision: number; readonly date: number; readonly change: string }[]
}

export type ReportEngagement = {
  readonly number: number
  readonly title: string
  readonly openedAt: number
  readonly product: string
  readonly goal: string
  readonly symptom: string
  readonly operatingPoint: readonly Fact[]
  readonly oscillators: readonly Fact[]
  readonly alreadyTried: string
  /** The question as agreed in the approved scope. */
  readonly scope: string
}

export type Fact = { readonly label: string; readonly value: string }

export type ReportEvidence = {
  readonly number: number
  readonly name: string
  readonly sha256: string
  readonly sizeBytes: number
  readonly receivedAt: number
  readonly facts: readonly Fact[]
  /** What was not stated, and what that rules out. */
  readonly missing: readonly string[]
}

export type ReportFinding = {
  readonly number: number
  readonly claim: string
  readonly severity: string
  readonly confidence: string
  readonly reasoning: string
  readonly alternativeCauses: string
  readonly disprovingExperiment: string
  readonly actions: readonly {
    readonly instruction: string
    readonly partValues: string
    readonly sideEffects: string
  }[]
  /** Numbers of runs in this document, from 1. */
  readonly runNumbers: readonly number[]
  /** Numbers of pieces of evidence. */
  readonly evidenceNumbers: readonly number[]
  readonly figures: readonly Figure[]
}

/** A number and its unit as they are printed. */
export type ReportValue = {
  readonly label: string
  readonly symbol: string
  readonly number: string
  readonly unit: string
}

export type ReportRun = {
  /** From 1 within the document. */
  readonly number: number
  readonly title: string
  readonly methodId: string
  readonly methodVersion: number
  readonly formulas: readonly string[]
  readonly sources: readonly string[]
  readonly inputs: readonly (ReportValue & { readonly origin: string })[]
  readonly results: readonly (ReportValue & { readonly isMain: boolean })[]
  readonly validity: readonly { readonly passed: boolean; readonly sentence: string }[]
  readonly notes: readonly string[]
  readonly cautions: readonly string[]
}
