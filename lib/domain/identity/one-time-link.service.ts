import 'server-only'

import type { Tx } from '@/db/client'
import { findCompany } from '@/db/repositories/company.repo'
import {
  findInvitation,
  findInvitationByToken,
  findOneTimeLink,
  insertOneTimeLink,
  markInvitationAccepted,
  markLinkUsed,
  type InvitationRow,
  type OneTimeLinkRow,
} from '@/db/repositories/invitation.repo'
import {
  findPerson,
  findPersonByEmail,
  grantStaffRole,
  insertPerson,
  setPasswordHash,
  upsertMembership,
} from '@/db/repositories/person.repo'
import { endSessionsOf } from '@/db/repositories/session.repo'
import { withTx } from '@/db/tx'
import { err, ok, type Result } from '@/lib/core/result'

import type { Deps } from '../deps'
import { queueMail } from '../mail'
import { openOperation } from '../operation'
import { linkNotUsable, throttled, type IdentityError } from './identity.errors'
import { askForResetSchema, invitationTokenSchema, setPasswordSchema } from './identity.schema'
import { identityLimits } from './limits'
import { hashSecret } from './secret-hash'
import { countAgainst, isThrottled, linkBuckets } from './throttle'

export type InvitationDto = {
  readonly email: string
  readonly companyName: string | null
  readonly role: InvitationRow['role']
}

/** What an invitation offers, for the page that its link opens. The link alone lets nobody in. */
export const readInvitation = openOperation(
  'identity.readInvitation',
  invitationTokenSchema,
  async (deps, input): Promise<Result<InvitationDto, IdentityError>> => {
    const invitation = await usableInvitation(deps, input.token)
    if (!invitation) return err(linkNotUsable)
    const company = invitation.company_id ? await findCompany(deps.db, invitation.company_id) : undefined
    return ok({ email: invitation.email, companyName: company?.name ?? null, role: invitation.role })
  },
)

/** Mails the invited address a link that sets the password: single use, ten minutes, this browser only. */
export const askForInvitationLink = openOperation(
  'identity.askForInvitationLink',
  invitationTokenSchema,
  async (deps, input): Promise<Result<{ readonly email: string }, IdentityError>> => {
    const invitation = await usableInvitation(deps, input.token)
    if (!invitation) return err(linkNotUsable)
    const buckets = linkBuckets(invitation.email, deps.request.address)
    if (await isThrottled(deps.db, buckets, deps.clock.now())) return err(throttled)
    await countAgainst(deps.db, buckets, deps.clock.now())
    await withTx(deps.db, (tx) =>
      mailLink(tx, deps, invitation.email, { purpose: 'invitation', invitationId: invitation.id }),
    )
    return ok({ email: invitation.email })
  },
)

/** Mails a reset link to a known address; an unknown one gets the same answer and no mail. */
export const askForPasswordReset = openOperation(
  'identity.askForPasswordReset',
  askForResetSchema,
  async (deps, input): Promise<Result<{ readonly email: string }, IdentityError>> => {
    const buckets = linkBuckets(input.email, deps.request.address)
    if (await isThrottled(deps.db, buckets, deps.clock.now())) return err(throttled)
    await countAgainst(deps.db, buckets, deps.clock.now())
    await withTx(deps.db, async (tx) => {
      const person = await findPersonByEmail(tx, input.email)
      if (!person || person.disabled_at !== null) return
      await mailLink(tx, deps, person.email, { purpose: 'password_reset', personId: person.id })
    })
    return ok({ email: input.email })
  },
)

export type PasswordLinkDto = { readonly email: string; readonly needsName: boolean }

/** Whose password a link sets, for the page that it opens; looking does not use it up. */
export const readPasswordLink = openOperation(
  'identity.readPasswordLink',
  invitationTokenSchema,
  async (deps, input): Promise<Result<PasswordLinkDto, IdentityError>> => {
    const link = await findOneTimeLink(deps.db, hashSecret(input.token))
    if (!link || !isUsable(link, deps, deps.clock.now())) return err(linkNotUsable)
    if (link.person_id !== null) {
      const person = await findPerson(deps.db, link.person_id)
      return person ? ok({ email: person.email, needsName: false }) : err(linkNotUsable)
    }
    const invitation = link.invitation_id ? await findInvitation(deps.db, link.invitation_id) : undefined
    if (!invitation) return err(linkNotUsable)
    const known = await findPersonByEmail(deps.db, invitation.email)
    return ok({ email: invitation.email, needsName: known === undefined })
  },
)

/**
 * Uses a link up: sets the password and, for an invitation, creates the person and their membership or role. Every
 * earlier session of the person ends.
 */
export const setPassword = openOperation(
  'identity.setPassword',
  setPasswordSchema,
  async (deps, input): Promise<Result<{ readonly email: string }, IdentityError>> => {
    const passwordHash = await deps.passwords.hash(input.password)
    return withTx(deps.db, async (tx): Promise<Result<{ email: string }, IdentityError>> => {
      const now = deps.clock.now()
      const link = await findOneTimeLink(tx, hashSecret(input.token))
      if (!link || !isUsable(link, deps, now)) return err(linkNotUsable)
      const person = await personBehind(tx, deps, link, input.name)
      if (!person.ok) return person
      await markLinkUsed(tx, link.id, now)
      await setPasswordHash(tx, person.value.id, passwordHash)
      await endSessionsOf(tx, person.value.id, now)
      return ok({ email: person.value.email })
    })
  },
)

async function usableInvitation(deps: Deps, token: string): Promise<InvitationRow | undefined> {
  const invitation = await findInvitationByToken(deps.db, hashSecret(token))
  if (!invitation || invitation.accepted_at !== null) return undefined
  return deps.clock.now() < invitation.expires_at ? invitation : undefined
}

type LinkTarget =
  | { readonly purpose: 'invitation'; readonly invitationId: string }
  | { readonly purpose: 'password_reset'; readonly personId: string }

async function mailLink(tx: Tx, deps: Deps, email: string, target: LinkTarget): Promise<void> {
  const now = deps.clock.now()
  const id = deps.ids.newId()
  const token = deps.ids.newSecret()
  const expiresAt = now + identityLimits.oneTimeLink
  await insertOneTimeLink(tx, {
    id,
    token_hash: hashSecret(token),
    purpose: target.purpose,
    person_id: target.purpose === 'password_reset' ? target.personId : null,
    invitation_id: target.purpose === 'invitation' ? target.invitationId : null,
    browser_hash: hashSecret(deps.request.browserSecret),
    created_at: now,
    expires_at: expiresAt,
    used_at: null,
  })
  await queueMail(tx, deps, {
    to: email,
    dedupeKey: `link:${id}`,
    mail: {
      kind: 'one_time_link',
      purpose: target.purpose,
      link: `${deps.settings.publicUrl}/set-password/${token}`,
      expiresAt,
    },
  })
}

function isUsable(link: OneTimeLinkRow, deps: Deps, now: number): boolean {
  const isOurBrowser = link.browser_hash === hashSecret(deps.request.browserSecret)
  return link.used_at === null && now < link.expires_at && isOurBrowser
}

type PersonBehindLink = { readonly id: string; readonly email: string }

async function personBehind(
  tx: Tx,
  deps: Deps,
  link: OneTimeLinkRow,
  name: string,
): Promise<Result<PersonBehindLink, IdentityError>> {
  if (link.person_id !== null) {
    const person = await findPerson(tx, link.person_id)
    return person && person.disabled_at === null ? ok(person) : err(linkNotUsable)
  }
  const invitation = link.invitation_id ? await findInvitation(tx, link.invitation_id) : undefined
  if (!invitation || invitation.accepted_at !== null) return err(linkNotUsable)
  const known = await findPersonByEmail(tx, invitation.email)
  if (known && known.disabled_at !== null) return err(linkNotUsable)
  if (!known && name === '') return err(nameNeeded)
  const person = known ?? { id: deps.ids.newId(), email: invitation.email }
  if (!known) await createPerson(tx, deps, person, name)
  await takeUpInvitation(tx, deps, invitation, person.id)
  return ok(person)
}

async function createPerson(tx: Tx, deps: Deps, person: PersonBehindLink, name: string): Promise<void> {
  await insertPerson(tx, {
    ...person,
    name,
    password_hash: null,
    is_consultant: 0,
    is_administrator: 0,
    created_at: deps.clock.now(),
    disabled_at: null,
  })
}

async function takeUpInvitation(tx: Tx, deps: Deps, invitation: InvitationRow, personId: string) {
  const now = deps.clock.now()
  const { role } = invitation
  if (role === 'consultant') await grantStaffRole(tx, personId, 'is_consultant')
  else if (role === 'administrator') await grantStaffRole(tx, personId, 'is_administrator')
  else if (invitation.company_id !== null) {
    await upsertMembership(tx, {
      company_id: invitation.company_id,
      person_id: personId,
      role,
      created_at: now,
      removed_at: null,
    })
  }
  await markInvitationAccepted(tx, invitation.id, now)
}

const nameNeeded: IdentityError = {
  code: 'name_needed',
  message: 'Enter your name as it should appear in reports.',
  fields: { name: 'Your name is needed.' },
}
