export type PracticeAuthorityTable = {
  id: 1
  certificate_pem: string
  fingerprint: string
  sealed_key: string
  created_at: number
}

export type SigningCertificateTable = {
  id: string
  person_id: string
  certificate_pem: string
  fingerprint: string
  serial: string
  sealed_key: string
  valid_from: number
  valid_until: number
  created_at: number
  revoked_at: number | null
}

export type ReportStatus =
  'draft' | 'in_review' | 'returned' | 'approved' | 'author_signed' | 'released' | 'withdrawn'

export type ReportTable = {
  id: string
  engagement_id: string
  number: string
  revision: number
  title: string
  summary_belief: string
  summary_certainty: string
  summary_next_step: string
  status: ReportStatus
  author_id: string
  reviewer_id: string | null
  check_code: string
  document: string | null
  file_id: string | null
  file_sha256: string | null
  signature_areas: string | null
  created_at: number
  submitted_at: number | null
  approved_at: number | null
  released_at: number | null
}

export type ReportFindingTable = { report_id: string; finding_id: string; position: number }

export type ReportRemarkTable = {
  id: string
  report_id: string
  author_id: string
  section: string
  text: string
  created_at: number
}

export type ReportSignatureTable = {
  report_id: string
  role: 'author' | 'reviewer'
  person_id: string
  certificate_fingerprint: string
  signed_at: number
}
