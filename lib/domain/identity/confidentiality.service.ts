import 'server-only'

import { findCurrentTerms, insertAcceptance } from '@/db/repositories/confidentiality.repo'
import { withTx } from '@/db/tx'
import { authorize, notFound } from '@/lib/authz/authorize'
import { err, ok } from '@/lib/core/result'

import { operation } from '../operation'
import type { IdentityError } from './identity.errors'
import { acceptTermsSchema, companyIdSchema } from './identity.schema'

/** The confidentiality terms in force, as the person is asked to accept them for one company. */
export const readTerms = operation('identity.readTerms', companyIdSchema, async (deps, actor, input) => {
  const allowed = authorize(actor, 'company.acceptTerms', { kind: 'company', companyId: input.companyId })
  if (!allowed.ok) return allowed
  const terms = await findCurrentTerms(deps.db)
  if (!terms) return err(notFound)
  const membership = actor.memberships.find((held) => held.companyId === input.companyId)
  return ok({
    version: terms.version,
    title: terms.title,
    body: terms.body,
    companyName: membership?.companyName ?? '',
  })
})

/** Records that the person accepted the version in force, with typed name, time and network address. */
export const acceptTerms = operation(
  'identity.acceptTerms',
  acceptTermsSchema,
  async (deps, actor, input) => {
    const allowed = authorize(actor, 'company.acceptTerms', { kind: 'company', companyId: input.companyId })
    if (!allowed.ok) return allowed
    return withTx(deps.db, async (tx) => {
      const terms = await findCurrentTerms(tx)
      if (!terms || terms.version !== input.version) return err(termsChanged)
      await insertAcceptance(tx, {
        person_id: actor.personId,
        company_id: input.companyId,
        version: terms.version,
        typed_name: input.typedName,
        network_address: deps.request.address,
        accepted_at: deps.clock.now(),
      })
      return ok({ version: terms.version })
    })
  },
)

const termsChanged: IdentityError = {
  code: 'terms_changed',
  message: 'A newer version of the terms was published while this page was open. Read it, then accept again.',
}
