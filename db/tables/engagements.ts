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
