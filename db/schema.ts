import type { Generated } from 'kysely'

/** Table name to row type. Instants are UTC milliseconds, money integer cents, time integer minutes, values SI. */
export type Database = {
  company: CompanyTable
  person: PersonTable
  membership: MembershipTable
  invitation: InvitationTable
  one_time_link: OneTimeLinkTable
  session: SessionTable
  throttle_event: ThrottleEventTable
  confidentiality_terms: ConfidentialityTermsTable
  confidentiality_acceptance: ConfidentialityAcceptanceTable
  engagement: EngagementTable
  brief: BriefTable
  known_oscillator: KnownOscillatorTable
  engagement_client: EngagementClientTable
  engagement_consultant: EngagementConsultantTable
  scope: ScopeTable
  evidence: EvidenceTable
  capture: CaptureTable
  capture_channel: CaptureChannelTable
  measurement_fact: MeasurementFactTable
  method_run: MethodRunTable
  method_run_evidence: MethodRunEvidenceTable
  finding: FindingTable
  finding_run: FindingRunTable
  finding_action: FindingActionTable
  hour_block: HourBlockTable
  hour_ledger_entry: HourLedgerEntryTable
  running_timer: RunningTimerTable
  time_entry: TimeEntryTable
  practice_authority: PracticeAuthorityTable
  signing_certificate: SigningCertificateTable
  report: ReportTable
  report_finding: ReportFindingTable
  report_remark: ReportRemarkTable
  report_signature: ReportSignatureTable
  block_offer: BlockOfferTable
  purchase: PurchaseTable
  payment: PaymentTable
  provider_event: ProviderEventTable
  provider_effect: ProviderEffectTable
  outbox_message: OutboxMessageTable
}

export type CompanyTable = { id: string; name: string; created_at: number }

export type PersonTable = {
  id: string
  email: string
  name: string
  password_hash: string | null
  is_consultant: 0 | 1
  is_administrator: 0 | 1
  created_at: number
  disabled_at: number | null
}

export type CompanyRole = 'purchaser' | 'engineer'
export type InvitedRole = CompanyRole | 'consultant' | 'administrator'

export type MembershipTable = {
  company_id: string
  person_id: string
  role: CompanyRole
  created_at: number
  removed_at: number | null
}

export type InvitationTable = {
  id: string
  token_hash: string
  email: string
  company_id: string | null
  role: InvitedRole
  invited_by: string
  created_at: number
  expires_at: number
  accepted_at: number | null
}

export type OneTimeLinkTable = {
  id: string
  token_hash: string
  purpose: 'invitation' | 'password_reset'
  person_id: string | null
  invitation_id: string | null
  browser_hash: string
  created_at: number
  expires_at: number
  used_at: number | null
}

export type SessionTable = {
  id_hash: string
  person_id: string
  created_at: number
  last_seen_at: number
  ended_at: number | null
}

export type ThrottleEventTable = { id: Generated<number>; bucket: string; at: number }

export type ConfidentialityTermsTable = { version: number; title: string; body: string; published_at: number }

export type ConfidentialityAcceptanceTable = {
  person_id: string
  company_id: string
  version: number
  typed_name: string
  network_address: string
  accepted_at: number
}

export type EngagementStatus = 'briefed' | 'scoped' | 'active' | 'closed'

export type EngagementTable = {
  id: string
  company_id: string
  number: number
  title: string
  status: EngagementStatus
  opened_by: string
  created_at: number
}

export type BriefTable = {
  engagement_id: string
  product: string
  goal_standard: string
  goal_class: string
  goal_test_date: string | null
  symptom: string
  vin_volts: number | null
  vout_volts: number | null
  iout_amperes: number | null
  switching_hertz: number | null
  spread_spectrum: string
  already_tried: string
}

export type KnownOscillatorTable = {
  engagement_id: string
  position: number
  name: string
  hertz: number
  tolerance_ppm: number
}

export type EngagementClientTable = {
  engagement_id: string
  person_id: string
  added_at: number
  removed_at: number | null
}

export type EngagementConsultantTable = {
  engagement_id: string
  person_id: string
  assigned_at: number
  removed_at: number | null
}

export type ScopeStatus = 'draft' | 'proposed' | 'approved' | 'declined' | 'superseded'

export type ScopeTable = {
  id: string
  engagement_id: string
  version: number
  body: string
  cap_minutes: number
  status: ScopeStatus
  author_id: string
  created_at: number
  proposed_at: number | null
  decided_by: string | null
  decided_at: number | null
  decision_note: string | null
}

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

export type MethodRunTable = {
  id: string
  engagement_id: string
  method_id: string
  method_version: number
  inputs: string
  result: string
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

export type HourBlockTable = {
  id: string
  company_id: string
  title: string
  minutes: number
  valid_from: number
  valid_until: number
  source_kind: string
  source_id: string
  created_at: number
}

export type LedgerKind = 'credit' | 'debit' | 'reversal' | 'expiry' | 'adjustment'

export type HourLedgerEntryTable = {
  id: string
  company_id: string
  block_id: string
  kind: LedgerKind
  minutes: number
  source_kind: string
  source_id: string
  engagement_id: string | null
  text: string
  created_by: string | null
  created_at: number
}

export type WorkKind = 'measurement' | 'analysis' | 'layout_review' | 'reporting' | 'review' | 'meeting'

export type RunningTimerTable = {
  person_id: string
  engagement_id: string
  work_kind: WorkKind
  text: string
  started_at: number
}

export type TimeEntryTable = {
  id: string
  engagement_id: string
  person_id: string
  work_kind: WorkKind
  text: string
  started_at: number
  worked_seconds: number
  posted_minutes: number | null
  posted_at: number | null
  created_at: number
}

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

export type BlockOfferTable = {
  id: string
  title: string
  minutes: number
  net_cents: number
  currency: string
  validity_months: number
  tax_basis_points: number
  tax_label: string
  created_at: number
  archived_at: number | null
}

export type PurchaseStatus = 'open' | 'paid' | 'failed' | 'expired' | 'refunded'

export type PurchaseTable = {
  id: string
  company_id: string
  person_id: string
  offer_id: string
  title: string
  minutes: number
  validity_months: number
  net_cents: number
  tax_cents: number
  gross_cents: number
  tax_label: string
  currency: string
  status: PurchaseStatus
  session_id: string | null
  receipt_number: number | null
  created_at: number
  paid_at: number | null
}

export type PaymentTable = {
  id: string
  purchase_id: string
  payment_intent_id: string
  gross_cents: number
  currency: string
  balance_transaction_id: string | null
  fee_cents: number | null
  net_cents: number | null
  created_at: number
}

export type ProviderEventOutcome = 'applied' | 'already_applied' | 'ignored' | 'refused'

export type ProviderEventTable = {
  id: string
  type: string
  object_id: string | null
  created_at: number
  received_at: number
  outcome: ProviderEventOutcome
  note: string
}

export type ProviderEffectTable = { object_id: string; effect: string; event_id: string }

export type OutboxMessageTable = {
  id: string
  kind: string
  recipient: string
  payload: string
  dedupe_key: string
  attempts: number
  next_attempt_at: number
  last_error: string | null
  sent_at: number | null
  created_at: number
}
