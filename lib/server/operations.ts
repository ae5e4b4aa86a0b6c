import 'server-only'

/** The gate between pages and the domain: what `app/` may ask for, by domain. */
export * as confidentiality from '@/lib/domain/identity/confidentiality.service'
export * as invitations from '@/lib/domain/identity/invitation.service'
export * as links from '@/lib/domain/identity/one-time-link.service'
export * as people from '@/lib/domain/identity/people.service'
export * as sessions from '@/lib/domain/identity/session.service'
