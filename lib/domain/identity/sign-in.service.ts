import 'server-only'

import { findPersonByEmail } from '@/db/repositories/person.repo'
import { insertSession } from '@/db/repositories/session.repo'
import { dropThrottleEvents } from '@/db/repositories/throttle.repo'
import { err, ok, type Result } from '@/lib/core/result'

import type { Deps } from '../deps'
import { openOperation } from '../operation'
import { normaliseEmail } from './email-address'
import { throttled, wrongCredentials, type IdentityError } from './identity.errors'
import { signInSchema } from './identity.schema'
import { hashSecret } from './secret-hash'
import { countAgainst, failedSignInBuckets, isThrottled } from './throttle'

export type SignedIn = {
  readonly personId: string
  readonly name: string
  readonly email: string
  /** Goes into the browser's cookie; the database keeps only its hash. */
  readonly sessionSecret: string
}

/**
 * Checks e-mail and password and begins a new session. Unknown address, wrong password and disabled account answer
 * alike and take alike long; too many failures for the account or the network address are refused for a while.
 */
export const signIn = openOperation(
  'identity.signIn',
  signInSchema,
  async (deps, input): Promise<Result<SignedIn, IdentityError>> => {
    const person = await verifyPassword(deps, input.email, input.password)
    if (!person.ok) return person
    const now = deps.clock.now()
    const sessionSecret = deps.ids.newSecret()
    await insertSession(deps.db, {
      id_hash: hashSecret(sessionSecret),
      person_id: person.value.id,
      created_at: now,
      last_seen_at: now,
      ended_at: null,
    })
    const { id, name, email } = person.value
    return ok({ personId: id, name, email, sessionSecret })
  },
)

/** The check behind sign-in and behind every step that asks for the password again. */
export async function verifyPassword(deps: Deps, emailText: string, password: string) {
  const now = deps.clock.now()
  const email = normaliseEmail(emailText) ?? ''
  const buckets = failedSignInBuckets(email, deps.request.address)
  if (await isThrottled(deps.db, buckets, now)) return err(throttled)
  const person = await findPersonByEmail(deps.db, email)
  const isRight = await deps.passwords.verify(person?.password_hash ?? null, password)
  if (!person || !isRight || person.disabled_at !== null) {
    await countAgainst(deps.db, buckets, now)
    return err(wrongCredentials)
  }
  const [accountBucket] = buckets
  if (accountBucket) await dropThrottleEvents(deps.db, accountBucket.name)
  return ok(person)
}
