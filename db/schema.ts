import type {
  BlockOfferTable,
  PurchaseTable,
  PaymentTable,
  ProviderEventTable,
  ProviderEffectTable,
} from './tables/billing'
import type {
  EngagementTable,
  BriefTable,
  KnownOscillatorTable,
  EngagementClientTable,
  EngagementConsultantTable,
  ScopeTable,
} from './tables/engagements'
import type {
  EvidenceTable,
  CaptureTable,
  CaptureChannelTable,
  MeasurementFactTable,
} from './tables/evidence'
import type {
  MethodRunTable,
  MethodRunEvidenceTable,
  FindingTable,
  FindingRunTable,
  FindingActionTable,
} from './tables/findings'
import type { HourBlockTable, HourLedgerEntryTable, RunningTimerTable, TimeEntryTable } from './tables/hours'
import type {
  CompanyTable,
  PersonTable,
  MembershipTable,
  InvitationTable,
  OneTimeLinkTable,
  SessionTable,
  ThrottleEventTable,
  ConfidentialityTermsTable,
  ConfidentialityAcceptanceTable,
} from './tables/identity'
import type { OutboxMessageTable } from './tables/outbox'
import type {
  PracticeAuthorityTable,
  SigningCertificateTable,
  ReportTable,
  ReportFindingTable,
  ReportRemarkTable,
  ReportSignatureTable,
} from './tables/reports'

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
