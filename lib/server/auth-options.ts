import 'server-only'
import type { NextAuthOptions } from 'next-auth'
import Credentials from 'next-auth/providers/credentials'
import { z } from 'zod'

import { closeSession } from '@/lib/domain/identity/session.service'
import { signIn } from '@/lib/domain/identity/sign-in.service'
import { identityLimits } from '@/lib/domain/identity/limits'

import { container } from './container'
import { cookieNames } from './cookies'

const tokenSchema = z.object({ sessionSecret: z.string() })

/** The part of the signed cookie that we read: which session of ours it stands for. */
export function sessionSecretOf(token: unknown): string | null {
  const parsed = tokenSchema.safeParse(token)
  return parsed.success ? parsed.data.sessionSecret : null
}

const credentials = Credentials({
  name: 'E-mail and password',
  credentials: { email: { label: 'E-mail address' }, password: { label: 'Password', type: 'password' } },
  async authorize(input, request) {
    const { deps, log } = container()
    const forwarded: unknown = request.headers?.['x-forwarded-for']
    const address = typeof forwarded === 'string' ? (forwarded.split(',')[0]?.trim() ?? 'unknown') : 'unknown'
    const info = { id: deps.ids.newId(), address, browserSecret: '' }
    const { email, password } = input ?? {}
    const result = await signIn.execute({ ...deps, request: info }, { email, password })
    if (!result.ok) {
      log.warn({ requestId: info.id, address, reason: result.error.code }, 'sign-in refused')
      // next-auth hands the message of an error thrown here to the sign-in page as a code.
      throw new Error(result.error.code)
    }
    const { personId, name, sessionSecret } = result.value
    log.info({ requestId: info.id, personId }, 'signed in')
    return { id: personId, name, email: result.value.email, sessionSecret }
  },
})

/**
 * next-auth carries the cookie; whether it still opens anything is decided by our session row at every request.
 * The cookie is a signed and encrypted token because the credentials provider supports no other strategy.
 */
export function authOptions(): NextAuthOptions {
  return {
    secret: container().env.authSecret,
    providers: [credentials],
    session: { strategy: 'jwt', maxAge: identityLimits.sessionAbsolute / 1000 },
    pages: { signIn: '/sign-in', error: '/sign-in' },
    cookies: {
      sessionToken: cookieNames.session,
      csrfToken: cookieNames.csrf,
      callbackUrl: cookieNames.callback,
    },
    callbacks: {
      jwt: ({ token, user }) => {
        const secret = sessionSecretOf(user)
        return secret ? { ...token, sessionSecret: secret } : token
      },
    },
    events: {
      signOut: async ({ token }) => {
        const secret = sessionSecretOf(token)
        if (secret) await closeSession(container().deps, secret)
      },
    },
  }
}
