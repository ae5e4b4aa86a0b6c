export type MethodRunTable = {
  id: string
  engagement_id: string
  /** Counted from 1 within the engagement. */
  number: number
  method_id: string
  method_version: number
  inputs: string
  result: string
  /** Apart from the result, so that a list of runs need not read them. */
  figures: string
  created_by: string
  created_at: number
}

export type MethodRunEvidenceTable = { run_id: string; evidence_id: string; sha256: string }

export type FindingSeverity = 'critical' | 'major' | 'minor' | 'note'

export type FindingConfidence = 'high' | 'medium' | 'low'

export type FindingTable = {
  id: string
  engagement_id: string
  number: number
  claim: string
  severity: FindingSeverity
  confidence: FindingConfidence
  reasoning: string
  alternative_causes: string
  disproving_experiment: string
  status: 'draft' | 'published'
  author_id: string
  created_at: number
  published_at: number | null
}

export type FindingRunTable = { finding_id: string; run_id: string; position: number }

export type FindingActionTable = {
  id: string
  finding_id: string
  position: number
  instruction: string
  part_values: string
  side_effects: string
}
