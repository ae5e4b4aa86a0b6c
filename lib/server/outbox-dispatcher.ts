import 'server-only'

import {
  listDueMessages,
  markMessageFailed,
  markMessageSent,
  type OutboxRow,
} from '@/db/repositories/outbox.repo'
import { renderMail } from '@/emails/render-mail'
import { mailSchema } from '@/lib/domain/mail'

import type { Container } from './container'

const minute = 60_000

/** Waiting times after each failure; a message that failed as often as there are entries is given up. */
const backoff = [1, 5, 15, 30, 60, 120, 240, 480, 720, 1440].map((minutes) => minutes * minute)

const never = Number.MAX_SAFE_INTEGER

type Sender = Pick<Container, 'deps' | 'mailer' | 'log'>

/**
 * Sends what is due, oldest first. The row's id is the provider's idempotency key, so that a message whose answer got
 * lost is not mailed twice.
 * @returns how many messages went out.
 */
export async function dispatchOutbox(sender: Sender): Promise<number> {
  const due = await listDueMessages(sender.deps.db, sender.deps.clock.now(), 20)
  let sent = 0
  for (const row of due) if (await dispatch(sender, row)) sent += 1
  return sent
}

async function dispatch({ deps, mailer, log }: Sender, row: OutboxRow): Promise<boolean> {
  const { practiceName: name, practiceAddress: address } = deps.settings
  const mail = renderMail(mailSchema.parse(JSON.parse(row.payload)), { name, address })
  const result = await mailer.send({ to: row.recipient, ...mail, idempotencyKey: row.id })
  const now = deps.clock.now()
  if (result.ok) {
    await markMessageSent(deps.db, row.id, now)
    return true
  }
  const attempts = row.attempts + 1
  const wait = result.error.code === 'unavailable' ? backoff[row.attempts] : undefined
  await markMessageFailed(deps.db, row.id, {
    attempts,
    nextAttemptAt: wait === undefined ? never : now + wait,
    error: result.error.message,
  })
  log.warn({ messageId: row.id, kind: row.kind, attempts, reason: result.error.code }, 'mail not sent')
  return false
}

/** Looks for mail to send twice a second, one round at a time, until it is stopped. */
export function startOutboxDispatcher(sender: Sender, interval = 500): () => void {
  let isStopped = false
  const round = async () => {
    await dispatchOutbox(sender).catch((error: unknown) => sender.log.error({ error }, 'outbox round failed'))
    if (!isStopped) setTimeout(() => void round(), interval).unref()
  }
  void round()
  return () => {
    isStopped = true
  }
}
