import 'server-only'

import type { Tx } from '@/db/client'
import { findCompany, findCompanyByName, insertCompany } from '@/db/repositories/company.repo'
import { insertInvitation } from '@/db/repositories/invitation.repo'
import { findPersonByEmail, listMembershipsOf } from '@/db/repositories/person.repo'
import type { InvitedRole } from '@/db/tables/identity'
import { withTx } from '@/db/tx'
import type { Actor } from '@/lib/authz/actor'
import { authorize, type Denial } from '@/lib/authz/authorize'
import { practice } from '@/lib/authz/resource'
import { err, ok, type Result } from '@/lib/core/result'

import type { Deps } from '../deps'
import { queueMail } from '../mail'
import { operation } from '../operation'
import type { IdentityError } from './identity.errors'
import { inviteColleagueSchema, inviteCompanySchema, inviteStaffSchema } from './identity.schema'
import { identityLimits } from './limits'
import { hashSecret } from './secret-hash'

export type InvitationSent = { readonly email: string; readonly companyId: string | null }

/** Creates a client company and invites its first purchaser by e-mail. */
export const inviteCompany = operation(
  'identity.inviteCompany',
  inviteCompanySchema,
  async (deps, actor, input) => {
    const allowed = authorize(actor, 'company.invite', practice)
    if (!allowed.ok) return allowed
    return withTx(deps.db, async (tx): Promise<Result<InvitationSent, IdentityError>> => {
      if (await findCompanyByName(tx, input.companyName)) return err(companyExists(input.companyName))
      const companyId = deps.ids.newId()
      await insertCompany(tx, { id: companyId, name: input.companyName, created_at: deps.clock.now() })
      await sendInvitation(tx, deps, actor, {
        email: input.email,
        role: 'purchaser',
        company: { id: companyId, name: input.companyName },
      })
      return ok({ email: input.email, companyId })
    })
  },
)

/** Invites an engineer or a further purchaser into one's own company. */
export const inviteColleague = operation(
  'identity.inviteColleague',
  inviteColleagueSchema,
  async (deps, actor, input) => {
    const allowed = authorize(actor, 'company.inviteColleague', {
      kind: 'company',
      companyId: input.companyId,
    })
    if (!allowed.ok) return allowed
    return withTx(deps.db, async (tx): Promise<Result<InvitationSent, IdentityError>> => {
      const company = await findCompany(tx, input.companyId)
      if (!company) throw new Error('A member of a company that does not exist')
      if (await isMember(tx, input.email, company.id)) return err(alreadyAMember(input.email))
      await sendInvitation(tx, deps, actor, { email: input.email, role: input.role, company })
      return ok({ email: input.email, companyId: company.id })
    })
  },
)

/** Invites somebody to work for the practice, as consultant or administrator. */
export const inviteStaff = operation(
  'identity.inviteStaff',
  inviteStaffSchema,
  async (deps, actor, input): Promise<Result<InvitationSent, IdentityError | Denial>> => {
    const allowed = authorize(actor, 'person.inviteStaff', practice)
    if (!allowed.ok) return allowed
    await withTx(deps.db, (tx) =>
      sendInvitation(tx, deps, actor, { email: input.email, role: input.role, company: null }),
    )
    return ok({ email: input.email, companyId: null })
  },
)

type NewInvitation = {
  readonly email: string
  readonly role: InvitedRole
  readonly company: { readonly id: string; readonly name: string } | null
}

async function sendInvitation(tx: Tx, deps: Deps, actor: Actor, invitation: NewInvitation): Promise<void> {
  const now = deps.clock.now()
  const id = deps.ids.newId()
  const token = deps.ids.newSecret()
  const expiresAt = now + identityLimits.invitation
  await insertInvitation(tx, {
    id,
    token_hash: hashSecret(token),
    email: invitation.email,
    company_id: invitation.company?.id ?? null,
    role: invitation.role,
    invited_by: actor.personId,
    created_at: now,
    expires_at: expiresAt,
    accepted_at: null,
  })
  await queueMail(tx, deps, {
    to: invitation.email,
    dedupeKey: `invitation:${id}`,
    mail: {
      kind: 'invitation',
      companyName: invitation.company?.name ?? null,
      role: invitation.role,
      invitedBy: actor.name,
      link: `${deps.settings.publicUrl}/invitation/${token}`,
      expiresAt,
    },
  })
}

async function isMember(tx: Tx, email: string, companyId: string): Promise<boolean> {
  const person = await findPersonByEmail(tx, email)
  if (!person) return false
  const memberships = await listMembershipsOf(tx, person.id)
  return memberships.some((membership) => membership.companyId === companyId)
}

const companyExists = (name: string): IdentityError => ({
  code: 'company_exists',
  message: `A company named “${name}” is a client already. Open it to invite another purchaser.`,
  fields: { companyName: 'This name is taken.' },
})

const alreadyAMember = (email: string): IdentityError => ({
  code: 'already_a_member',
  message: `${email} belongs to this company already. Nothing was sent.`,
  fields: { email: 'Belongs to the company already.' },
})
