import type { Result } from '@/lib/core/result'

export type OutgoingMail = {
  /** One plain address, sent as it is stored. */
  readonly to: string
  readonly subject: string
  readonly html: string
  readonly text: string
  /** The same key with the same message never mails twice. */
  readonly idempotencyKey: string
}

export type MailerError = {
  /** rejected: this message will never be taken, a retry is pointless. unavailable: try it again later. */
  readonly code: 'rejected' | 'unavailable'
  readonly message: string
}

export type Mailer = {
  readonly send: (mail: OutgoingMail) => Promise<Result<{ readonly providerId: string }, MailerError>>
}
