import 'server-only'
import { cookies } from 'next/headers'
import { redirect } from 'next/navigation'
import { decode } from 'next-auth/jwt'
import { cache } from 'react'

import type { Actor } from '@/lib/authz/actor'
import { resolveSession } from '@/lib/domain/identity/session.service'

import { sessionSecretOf } from './auth-options'
import { container } from './container'
import { cookieNames } from './cookies'

/** The signed-in person of this request with today's roles, or null. Read once per request. */
export const currentActor = cache(async (): Promise<Actor | null> => {
  const jar = await cookies()
  const cookie = jar.get(cookieNames.session.name)?.value
  if (!cookie) return null
  const { env, deps } = container()
  const token = await decode({ token: cookie, secret: env.authSecret }).catch(() => null)
  const secret = sessionSecretOf(token)
  return secret ? resolveSession(deps, secret) : null
})

/** The signed-in person; anybody else is sent to the sign-in page, and a new member to the terms first. */
export async function requireActor(): Promise<Actor> {
  const actor = await currentActor()
  if (!actor) redirect('/sign-in')
  const pending = actor.memberships.find((membership) => !membership.hasAcceptedTerms)
  if (pending) redirect(`/terms/${pending.companyId}`)
  return actor
}
