import 'server-only'

import type { EvidenceRow } from '@/db/repositories/evidence.repo'
import type { EvidenceKind, EvidenceStatus } from '@/db/tables/evidence'

export type EvidenceDto = {
  readonly evidenceId: string
  readonly engagementId: string
  readonly number: number
  readonly name: string
  readonly kind: EvidenceKind
  readonly sizeBytes: number
  readonly sha256: string
  readonly status: EvidenceStatus
  readonly refusal: string | null
  readonly uploadedBy: string
  readonly uploadedAt: number
}

export const evidenceOf = (row: EvidenceRow): EvidenceDto => ({
  evidenceId: row.id,
  engagementId: row.engagement_id,
  number: row.number,
  name: row.name,
  kind: row.kind,
  sizeBytes: row.size_bytes,
  sha256: row.sha256,
  status: row.status,
  refusal: row.refusal,
  uploadedBy: row.uploader,
  uploadedAt: row.created_at,
})
