import type { Generated } from 'kysely'

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
