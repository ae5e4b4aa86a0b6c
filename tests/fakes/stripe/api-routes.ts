import { z } from 'zod'

import { json, type FakeReply, type FakeRequest, type Route } from '../http-server'
import { createIdempotency } from '../idempotency'
import type { TroubleQueue } from '../trouble'
import { findObject, type Account } from './account'
import { chargeOf, refundPayment } from './after-payment'
import { badRequest, keyClash, listReply, noSuch, refusal } from './api-replies'
import { createSession, sessionInput } from './create-session'
import { expand } from './expand'
import { formFields } from './form-fields'
import type { Webhooks } from './webhooks'

type Api = {
  readonly account: Account
  readonly webhooks: Webhooks
  readonly troubles: TroubleQueue
  /** Where the payment page lives; known when the server listens. */
  readonly pagesUrl: () => string
  readonly onRequest: (line: string) => void
}

const refundInput = z.strictObject({
  payment_intent: z.string(),
  amount: z
    .string()
    .regex(/^[1-9]\d*$/)
    .transform(Number)
    .optional(),
})

/** The calls that the portal's SDK makes, and no others. */
export function apiRoutes(api: Api): readonly Route[] {
  const once = createIdempotency(keyClash)
  const guarded =
    (act: (request: FakeRequest, id: string) => FakeReply) =>
    (request: FakeRequest, id = '') => {
      api.onRequest(`${request.method} ${request.url.pathname}`)
      return isKnownKey(request) ? api.troubles.around(() => act(request, id)) : unknownKey
    }
  const post = (path: RegExp, act: (fields: unknown) => FakeReply): Route => ({
    method: 'POST',
    path,
    answer: guarded((request) =>
      once(request.headers['idempotency-key'], `${request.url.pathname}\n${request.body}`, () =>
        act(formFields(request.body)),
      ),
    ),
  })
  const get = (path: RegExp, act: (url: URL, id: string) => FakeReply): Route => ({
    method: 'GET',
    path,
    answer: guarded((request, id) => act(request.url, id)),
  })
  const { store } = api.account
  return [
    post(/^\/v1\/checkout\/sessions$/, (fields) => {
      const input = sessionInput.safeParse(fields)
      if (!input.success) return badRequest(z.prettifyError(input.error))
      return json(200, createSession(api.account, api.pagesUrl(), input.data))
    }),
    post(/^\/v1\/refunds$/, (fields) => refundReply(api.account, fields)),
    get(/^\/v1\/balance_transactions$/, (url) => {
      const payout = url.searchParams.get('payout')
      const entries = [...store.balance.values()]
      return listReply(url, payout ? entries.filter(({ id }) => store.paidOutBy.get(id) === payout) : entries)
    }),
    get(/^\/v1\/payouts$/, (url) => listReply(url, [...store.payouts.values()])),
    get(/^\/v1\/events$/, (url) => {
      const wanted = url.searchParams.get('delivery_success')
      const records = [...api.webhooks.records.values()].filter(
        (record) => wanted === null || String(record.isDelivered) === wanted,
      )
      return listReply(
        url,
        records.map((record) => record.event),
      )
    }),
    get(
      /^\/v1\/(?:checkout\/sessions|payment_intents|charges|balance_transactions|payouts|refunds)\/([^/]+)$/,
      (url, id) => {
        const found = findObject(store, id)
        const paths = [...url.searchParams]
          .filter(([name]) => name.startsWith('expand['))
          .map(([, path]) => path)
        return found === undefined ? noSuch(id) : json(200, expand(store, found, paths))
      },
    ),
  ]
}

function refundReply(account: Account, fields: unknown): FakeReply {
  const input = refundInput.safeParse(fields)
  if (!input.success) return badRequest(z.prettifyError(input.error))
  const intent = account.store.intents.get(input.data.payment_intent)
  if (intent === undefined) return noSuch(input.data.payment_intent)
  if (intent.latest_charge === null) return badRequest('This payment has no charge that could be returned.')
  const charge = chargeOf(account, intent.id)
  const amount = input.data.amount ?? charge.amount - charge.amount_refunded
  if (amount > charge.amount - charge.amount_refunded) {
    return badRequest('The refund is greater than what is left of the charge.')
  }
  return json(200, refundPayment(account, intent.id, amount).refund)
}

/** Only keys of test mode: a real key must never be typed into a fake. */
const isKnownKey = ({ headers }: FakeRequest): boolean =>
  /^Bearer sk_test_\w+$/.test(headers.authorization ?? '')

const unknownKey = refusal(401, 'invalid_request_error', 'This fake takes keys that begin with sk_test_.')
