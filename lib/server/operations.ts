import 'server-only'

/** The gate between pages and the domain: what `app/` may ask for, by domain. */
export * as captures from '@/lib/domain/evidence/capture.service'
export * as confidentiality from '@/lib/domain/identity/confidentiality.service'
export * as engagementPeople from '@/lib/domain/engagements/people.service'
export * as engagements from '@/lib/domain/engagements/engagement.service'
export * as evidence from '@/lib/domain/evidence/evidence.service'
export * as invitations from '@/lib/domain/identity/invitation.service'
export * as links from '@/lib/domain/identity/one-time-link.service'
export * as people from '@/lib/domain/identity/people.service'
export * as scopes from '@/lib/domain/engagements/scope.service'
export * as sessions from '@/lib/domain/identity/session.service'
export * as uploads from '@/lib/domain/evidence/upload.service'
