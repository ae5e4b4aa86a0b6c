import { z } from 'zod'

import { redirect, type FakeReply, type Route } from '../http-server'
import type { Trouble, TroubleQueue } from '../trouble'
import type { Account } from './account'
import { chargeOf, openDispute, payOut, refundPayment } from './after-payment'
import { panelPage, type troubleNames } from './panel-page'
import { expireSession, payNow, settleLater } from './pay-session'
import type { Webhooks } from './webhooks'

const troubles: Readonly<Record<keyof typeof troubleNames, Trouble>> = {
  dropped: { kind: 'dropped' },
  half: { kind: 'half' },
  unreadable: { kind: 'unreadable' },
  slow: { kind: 'slow', milliseconds: 30_000 },
  busy: { kind: 'status', status: 429 },
  broken: { kind: 'status', status: 500 },
}

const troubleForm = z.object({
  kind: z.enum(['dropped', 'half', 'unreadable', 'slow', 'busy', 'broken']),
  count: z.coerce.number().int().min(1).max(20),
})

const webhookForm = z.object({
  order: z.enum(['as_they_happen', 'newest_first', 'held']),
  copies: z.coerce.number().int().min(1).max(50),
  delay: z.coerce.number().int().min(0).max(600_000),
})

const sessionForm = z.object({
  id: z.string(),
  act: z.enum(['pay', 'expire', 'arrive', 'fail', 'refund', 'dispute']),
})

export function panelRoutes(account: Account, webhooks: Webhooks, queue: TroubleQueue): readonly Route[] {
  const post = <T>(path: RegExp, schema: z.ZodType<T>, act: (form: T) => unknown): Route => ({
    method: 'POST',
    path,
    answer: async (request): Promise<FakeReply> => {
      const form = schema.safeParse(Object.fromEntries(new URLSearchParams(request.body)))
      if (form.success) await act(form.data)
      return redirect('/panel')
    },
  })
  return [
    { method: 'GET', path: /^\/$/, answer: () => redirect('/panel') },
    {
      method: 'GET',
      path: /^\/panel$/,
      answer: () => panelPage(account, webhooks, queue.waiting()),
    },
    post(/^\/panel\/trouble$/, troubleForm, ({ kind, count }) => queue.plan(troubles[kind], count)),
    post(/^\/panel\/webhooks$/, webhookForm, ({ order, copies, delay }) => {
      webhooks.mode = { order, copies, delayMilliseconds: delay }
    }),
    post(/^\/panel\/redeliver$/, z.object({ id: z.string() }), ({ id }) =>
      webhooks.records.has(id) ? webhooks.deliver(id) : undefined,
    ),
    post(/^\/panel\/pay-out$/, z.object({}), () => payOut(account)),
    post(/^\/panel\/session$/, sessionForm, ({ id, act }) => actOn(account, id, act)),
  ]
}

/** Buttons may be pressed on a page that is out of date; then nothing happens. */
async function actOn(account: Account, id: string, act: z.infer<typeof sessionForm>['act']): Promise<void> {
  const session = account.store.sessions.get(id)
  const intent = account.store.intents.get(session?.payment_intent ?? '')
  if (session?.status === 'open') {
    if (act === 'pay') await payNow(account, id)
    if (act === 'expire') await expireSession(account, id)
  } else if (intent?.status === 'processing') {
    if (act === 'arrive') await settleLater(account, id, 'succeeded')
    if (act === 'fail') await settleLater(account, id, 'failed')
  } else if (intent?.status === 'succeeded') {
    const { amount, amount_refunded: returned } = chargeOf(account, intent.id)
    if (act === 'refund' && returned < amount)
      await refundPayment(account, intent.id, amount - returned).published
    if (act === 'dispute') await openDispute(account, intent.id)
  }
}
