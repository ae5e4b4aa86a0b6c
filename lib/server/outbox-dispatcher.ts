import 'server-only'

import {
  listDueMessages,
  markMessageFailed,
  markMessageSent,
  type OutboxRow,
} from '@/db/repositories/outbox.repo'
import { renderMail } from '@/emails/render-mail'
import { err, type Result } from '@/lib/core/result'
import { mailSchema } from '@/lib/domain/mail'
import type { MailerError } from '@/lib/ports/mailer'

import type { Container } from './container'
import { repeatedly } from './repeatedly'

const minute = 60_000

/** Waiting times after each failure; a message that failed as often as there are entries is given up. */
const backoff = [1, 5, 30, 60, 120, 240, 480, 720, 1440].map((minutes) => minutes * minute)

/** The last instant that a date can hold. */
const never = 8.64e15

const messagesEachRound = 20

type Sender = Pick<Container, 'mailer' | 'log'> & {
  readonly deps: Pick<Container['deps'], 'db' | 'clock' | 'settings'>
}

/**
 * Sends what is due, oldest first. The row's id is the provider's idempotency key, so that a message whose answer got
 * lost is not mailed twice.
 * @returns how many messages went out.
 */
export async function dispatchOutbox(sender: Sender): Promise<number> {
  const due = await listDueMessages(sender.deps.db, sender.deps.clock.now(), messagesEachRound)
  let sent = 0
  for (const row of due) if (await dispatch(sender, row)) sent += 1
  return sent
}

async function dispatch(sender: Sender, row: OutboxRow): Promise<boolean> {
  const { deps, log } = sender
  const result = await send(sender, row)
  const now = deps.clock.now()
  if (result.ok) {
    await markMessageSent(deps.db, row.id, now)
    return true
  }
  const wait = result.error.code === 'unavailable' ? backoff[row.attempts] : undefined
  await markMessageFailed(deps.db, row.id, {
    attempts: row.attempts + 1,
    nextAttemptAt: wait === undefined ? never : now + wait,
    error: result.error.message,
  })
  const about = { messageId: row.id, kind: row.kind, attempts: row.attempts + 1, reason: result.error.code }
  if (wait === undefined) log.error(about, 'mail given up')
  else log.warn(about, 'mail not sent, tried again later')
  return false
}

async function send(
  { deps, mailer }: Sender,
  row: OutboxRow,
): Promise<Result<{ readonly providerId: string }, MailerError>> {
  const { practiceName: name, practiceAddress: address } = deps.settings
  try {
    const mail = renderMail(mailSchema.parse(JSON.parse(row.payload)), { name, address })
    return await mailer.send({ to: row.recipient, ...mail, idempotencyKey: row.id })
  } catch {
    // One message that cannot be written must not hold up those behind it.
    return err({ code: 'rejected', message: 'The stored message cannot be written out.' })
  }
}

/** Looks for mail to send twice a second, one round at a time, until it is stopped. */
export const startOutboxDispatcher = (sender: Sender, interval = 500): (() => void) =>
  repeatedly(
    interval,
    () => dispatchOutbox(sender),
    (error) => sender.log.error({ error }, 'outbox round failed'),
  )
