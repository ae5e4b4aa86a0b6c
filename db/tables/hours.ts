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
