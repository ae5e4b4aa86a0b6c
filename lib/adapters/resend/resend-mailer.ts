import { Resend } from 'resend'
import { z } from 'zod'

import { err, ok } from '@/lib/core/result'
import type { Mailer, MailerError, OutgoingMail } from '@/lib/ports/mailer'

import { isOnePlainAddress } from './plain-address'

export type ResendSettings = {
  readonly apiKey: string
  readonly from: string
  /** Another address that speaks the same interface; the real service when absent. */
  readonly apiBase?: URL
  readonly timeoutMilliseconds?: number
}

const defaultTimeoutMilliseconds = 15_000

const accepted = z.object({ id: z.string().min(1) })
const refusal = z.object({ name: z.string(), message: z.string() })

/** Refusals that lie in the message itself: sending it again cannot help. */
const faultsOfTheMessage = new Set([
  'validation_error',
  'missing_required_field',
  'invalid_parameter',
  'invalid_attachment',
  'invalid_idempotency_key',
  'invalid_idempotent_request',
])

export function createResendMailer(settings: ResendSettings): Mailer {
  const resend = new Resend(
    settings.apiKey,
    settings.apiBase && { baseUrl: settings.apiBase.href.replace(/\/$/, '') },
  )
  return {
    send: async (mail) => {
      if (!isOnePlainAddress(mail.to)) return err(notOneAddress)
      const reply = await replyTo(() =>
        resend.emails.send(messageOf(settings.from, mail), {
          idempotencyKey: mail.idempotencyKey,
          signal: AbortSignal.timeout(settings.timeoutMilliseconds ?? defaultTimeoutMilliseconds),
        }),
      )
      const sent = accepted.safeParse(reply?.data)
      return sent.success ? ok({ providerId: sent.data.id }) : err(errorOf(reply?.error))
    },
  }
}

const messageOf = (from: string, { to, subject, html, text }: OutgoingMail) => ({
  from,
  to: [to],
  subject,
  html,
  text,
})

/** The SDK answers most failures with a value, but throws when time runs out while it reads a refusal. */
async function replyTo<T>(call: () => Promise<T>): Promise<T | null> {
  try {
    return await call()
  } catch {
    return null
  }
}

function errorOf(reply: unknown): MailerError {
  const parsed = refusal.safeParse(reply)
  if (parsed.success && faultsOfTheMessage.has(parsed.data.name)) {
    return {
      code: 'rejected',
      message: `The mail service does not take this message: ${parsed.data.message}`,
    }
  }
  const reason = parsed.success ? ` (${parsed.data.name}: ${parsed.data.message})` : ''
  return {
    code: 'unavailable',
    message: `The mail service did not confirm the message${reason}. It stays queued and is tried again.`,
  }
}

const notOneAddress: MailerError = {
  code: 'rejected',
  message: 'The recipient is not one plain e-mail address. Correct the address of this person.',
}
