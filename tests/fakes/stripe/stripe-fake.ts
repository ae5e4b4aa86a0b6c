import { serve } from '../http-server'
import { page, pageAssets } from '../page'
import { createTroubleQueue, type TroubleQueue } from '../trouble'
import { html } from '@/emails/html'

import { need, openStore, type Account, type Store } from './account'
import { closeDispute, openDispute, payOut, refundPayment } from './after-payment'
import { apiRoutes } from './api-routes'
import { createIds } from './ids'
import { panelRoutes } from './panel-routes'
import { payRoutes } from './pay-page'
import { expireSession, payLater, payNow, settleLater } from './pay-session'
import { signatureHeader } from './webhook-signature'
import { Webhooks, type EventRecord, type WebhookMode } from './webhooks'
import type { WirePayout, WireSession } from './wire'

export type StripeFakeOptions = {
  /** 0 takes a free port. */
  readonly port: number
  /** Where events go; without it they are only kept, as undelivered. */
  readonly webhookUrl?: string
  readonly webhookSecret: string
  /** Makes identifiers repeatable. */
  readonly seed?: number
  readonly now?: () => number
  /** Pauses between attempts to deliver an event; after the last one it stays undelivered. */
  readonly retryDelaysMilliseconds?: readonly number[]
}

export type SignedDelivery = { readonly id: string; readonly body: string; readonly signature: string }

type EventToSign = {
  readonly type: string
  readonly object: unknown
  readonly id?: string
  readonly createdAt?: number
  readonly signedAt?: number
  readonly secret?: string
}

export type StripeFake = {
  readonly url: string
  readonly close: () => Promise<void>
  readonly sessions: () => readonly WireSession[]
  readonly events: () => readonly EventRecord[]
  /** One line a call, such as "POST /v1/checkout/sessions". */
  readonly requests: () => readonly string[]
  readonly store: Store
  readonly troubles: TroubleQueue
  readonly setWebhookMode: (mode: Partial<WebhookMode>) => void
  /** Changes what the service says about a session, as a hostile or broken one would. */
  readonly tamper: (sessionId: string, changes: Partial<WireSession>) => void
  /** These resolve with the event's id once it was first sent. */
  readonly payNow: (sessionId: string) => Promise<string>
  readonly payLater: (sessionId: string) => Promise<string>
  readonly settleLater: (sessionId: string, outcome: 'succeeded' | 'failed') => Promise<string>
  readonly expire: (sessionId: string) => Promise<string>
  readonly refund: (paymentIntentId: string, amountCents: number) => Promise<string>
  readonly openDispute: (paymentIntentId: string) => Promise<string>
  readonly closeDispute: (disputeId: string, outcome: 'won' | 'lost') => Promise<string>
  readonly payOut: () => Promise<readonly WirePayout[]>
  /** Sends an event again, one after another or all at once; the statuses of the answers, 0 for none. */
  readonly deliver: (eventId: string, times?: number, parallel?: boolean) => Promise<readonly number[]>
  /** An event of the fake as it would be delivered, for tests that call the webhook's service directly. */
  readonly signedEvent: (eventId: string, signedAt?: number) => SignedDelivery
  /** An event of the test's own making, rightly or wrongly signed. */
  readonly buildSignedEvent: (event: EventToSign) => SignedDelivery
}

const secondsToMilliseconds = (seconds: number) => seconds * 1_000
const patientRetries = [1, 3, 10, 30, 60, 300, 900].map(secondsToMilliseconds)

export async function startStripeFake(options: StripeFakeOptions): Promise<StripeFake> {
  const now = options.now ?? Date.now
  const newId = createIds(options.seed)
  const webhooks = new Webhooks({
    url: options.webhookUrl,
    secret: options.webhookSecret,
    newId,
    now,
    retryDelaysMilliseconds: options.retryDelaysMilliseconds ?? patientRetries,
  })
  const account: Account = {
    store: openStore(),
    newId,
    now,
    publish: (type, object) => webhooks.publish(type, object),
  }
  const troubles = createTroubleQueue()
  const requests: string[] = []
  const server = await serve(
    options.port,
    [
      ...apiRoutes({
        account,
        webhooks,
        troubles,
        pagesUrl: () => server.url,
        onRequest: (line) => requests.push(line),
      }),
      ...payRoutes(account),
      ...panelRoutes(account, webhooks, troubles),
      ...pageAssets,
    ],
    notThere,
  )
  return {
    url: server.url,
    close: () => {
      webhooks.close()
      return server.close()
    },
    requests: () => requests,
    troubles,
    ...accountControls(account),
    ...webhookControls(webhooks, { secret: options.webhookSecret, newId, now }),
  }
}

const accountControls = (account: Account) => ({
  store: account.store,
  sessions: () => [...account.store.sessions.values()],
  tamper: (sessionId: string, changes: Partial<WireSession>) =>
    void Object.assign(need(account.store.sessions, sessionId), changes),
  payNow: (sessionId: string) => payNow(account, sessionId),
  payLater: (sessionId: string) => payLater(account, sessionId),
  settleLater: (sessionId: string, outcome: 'succeeded' | 'failed') =>
    settleLater(account, sessionId, outcome),
  expire: (sessionId: string) => expireSession(account, sessionId),
  refund: (paymentIntentId: string, amountCents: number) =>
    refundPayment(account, paymentIntentId, amountCents).published,
  openDispute: (paymentIntentId: string) => openDispute(account, paymentIntentId),
  closeDispute: (disputeId: string, outcome: 'won' | 'lost') => closeDispute(account, disputeId, outcome),
  payOut: () => payOut(account),
})

type Signer = Pick<Account, 'newId' | 'now'> & { readonly secret: string }

const webhookControls = (webhooks: Webhooks, { secret, newId, now }: Signer) => ({
  events: () => [...webhooks.records.values()],
  setWebhookMode: (mode: Partial<WebhookMode>) => {
    webhooks.mode = { ...webhooks.mode, ...mode }
  },
  deliver: async (eventId: string, times = 1, parallel = false) => {
    if (parallel) return Promise.all(Array.from({ length: times }, () => webhooks.deliver(eventId)))
    const statuses: number[] = []
    for (let time = 0; time < times; time += 1) statuses.push(await webhooks.deliver(eventId))
    return statuses
  },
  signedEvent: (eventId: string, signedAt = now()): SignedDelivery => {
    const { body } = need(webhooks.records, eventId)
    return { id: eventId, body, signature: signatureHeader(body, secret, signedAt) }
  },
  buildSignedEvent: ({ type, object, ...rest }: EventToSign): SignedDelivery => {
    const id = rest.id ?? newId('evt')
    const created = Math.floor((rest.createdAt ?? now()) / 1000)
    const event = {
      id,
      object: 'event',
      api_version: 'fake',
      created,
      livemode: false,
      type,
      data: { object },
    }
    const body = JSON.stringify(event, null, 2)
    return { id, body, signature: signatureHeader(body, rest.secret ?? secret, rest.signedAt ?? now()) }
  },
})

const notThere = page({
  title: 'Nothing here',
  banner: 'Local stand-in for the payment service – no money moves',
  status: 404,
  body: html`<p>This stand-in has no such page or call. <a href="/panel">What it holds</a></p>`,
})
