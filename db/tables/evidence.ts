export type EvidenceKind = 'capture' | 'document' | 'picture' | 'attachment'

export type EvidenceStatus = 'checking' | 'ready' | 'refused'

export type EvidenceTable = {
  id: string
  engagement_id: string
  number: number
  name: string
  kind: EvidenceKind
  media_type: string
  size_bytes: number
  sha256: string
  status: EvidenceStatus
  refusal: string | null
  uploaded_by: string
  created_at: number
}

export type CaptureTable = {
  evidence_id: string
  samples: number
  start_seconds: number
  interval_seconds: number
  interval_source: string
  /** JSON array of sentences. */
  warnings: string
}

export type CaptureChannelTable = {
  evidence_id: string
  position: number
  name: string
  unit: string
  minimum: number
  maximum: number
}

export type MeasurementFactTable = {
  evidence_id: string
  key: string
  value: string
  stated_by: string
  stated_at: number
}
