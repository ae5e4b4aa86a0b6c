import 'server-only'
import { z } from 'zod'

import type { Tx } from '@/db/client'
import { insertOutboxMessage } from '@/db/repositories/outbox.repo'

import type { Deps } from './deps'

const instant = z.int()
const cents = z.int()

/** Everything that the portal ever mails; stored in the outbox and rendered when it is sent. */
export const mailSchema = z.discriminatedUnion('kind', [
  z.object({
    kind: z.literal('invitation'),
    companyName: z.string().nullable(),
    role: z.enum(['purchaser', 'engineer', 'consultant', 'administrator']),
    invitedBy: z.string(),
    link: z.url(),
    expiresAt: instant,
  }),
  z.object({
    kind: z.literal('one_time_link'),
    purpose: z.enum(['invitation', 'password_reset']),
    link: z.url(),
    expiresAt: instant,
  }),
  z.object({
    kind: z.literal('receipt'),
    receiptNumber: z.int(),
    companyName: z.string(),
    title: z.string(),
    minutes: z.int(),
    netCents: cents,
    taxCents: cents,
    taxLabel: z.string(),
    grossCents: cents,
    currency: z.string(),
    paidAt: instant,
    balanceMinutes: z.int(),
    validUntil: instant,
  }),
  z.object({
    kind: z.literal('scope_proposed'),
    engagementTitle: z.string(),
    capMinutes: z.int(),
    proposedBy: z.string(),
    link: z.url(),
  }),
  z.object({
    kind: z.literal('report_released'),
    engagementTitle: z.string(),
    reportNumber: z.string(),
    revision: z.int(),
    link: z.url(),
    checkLink: z.url(),
    checkCode: z.string(),
  }),
])

export type Mail = z.infer<typeof mailSchema>

/**
 * Decides, inside the transaction that causes it, that a message goes out. It is sent after the commit; the key makes
 * sure that the same cause never mails twice.
 */
export async function queueMail(
  tx: Tx,
  deps: Pick<Deps, 'clock' | 'ids'>,
  message: { readonly to: string; readonly mail: Mail; readonly dedupeKey: string },
): Promise<void> {
  const now = deps.clock.now()
  await insertOutboxMessage(tx, {
    id: deps.ids.newId(),
    kind: message.mail.kind,
    recipient: message.to,
    payload: JSON.stringify(message.mail),
    dedupe_key: message.dedupeKey,
    attempts: 0,
    next_attempt_at: now,
    last_error: null,
    sent_at: null,
    created_at: now,
  })
}
