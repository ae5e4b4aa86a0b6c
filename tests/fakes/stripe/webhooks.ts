import { need, stamp } from './account'
import type { NewId } from './ids'
import { signatureHeader } from './webhook-signature'
import type { WireEvent, WireObject } from './wire'

export type WebhookMode = {
  readonly delayMilliseconds: number
  /** How often each event is sent. */
  readonly copies: number
  /** held: only by hand; newest_first: whatever happens within a second and a half is sent in reverse. */
  readonly order: 'as_they_happen' | 'newest_first' | 'held'
}

export type EventRecord = {
  readonly event: WireEvent
  /** The text that is signed and sent, always the same. */
  readonly body: string
  /** The answer to each attempt: an HTTP status, or what went wrong. */
  readonly attempts: (number | string)[]
  isDelivered: boolean
}

type Setting = {
  readonly url: string | undefined
  readonly secret: string
  readonly newId: NewId
  readonly now: () => number
  readonly retryDelaysMilliseconds: readonly number[]
}

const gatherMilliseconds = 1_500
const answerWithinMilliseconds = 10_000

/** Sends signed events to the merchant, again after growing pauses until it answers with a 2xx status. */
export class Webhooks {
  readonly records = new Map<string, EventRecord>()
  mode: WebhookMode = { delayMilliseconds: 0, copies: 1, order: 'as_they_happen' }
  readonly #setting: Setting
  readonly #timers = new Set<NodeJS.Timeout>()
  readonly #gathered: string[] = []
  #isClosed = false

  constructor(setting: Setting) {
    this.#setting = setting
  }

  async publish(type: string, object: WireObject): Promise<string> {
    const event = this.record(type, object)
    const { order, delayMilliseconds } = this.mode
    if (this.#setting.url === undefined || order === 'held') return event.id
    if (order === 'newest_first') {
      this.#gathered.push(event.id)
      if (this.#gathered.length === 1) this.#after(gatherMilliseconds, () => this.#sendGathered())
    } else if (delayMilliseconds > 0) {
      this.#after(delayMilliseconds, () => this.#sendWithRetries(event.id))
    } else {
      await this.#sendWithRetries(event.id)
    }
    return event.id
  }

  /** Keeps an event with the object as it is now, without sending it. */
  record(type: string, object: WireObject): WireEvent {
    const event: WireEvent = {
      ...stamp(this.#setting),
      id: this.#setting.newId('evt'),
      object: 'event',
      api_version: 'fake',
      type,
      data: { object: structuredClone(object) },
    }
    this.records.set(event.id, {
      event,
      body: JSON.stringify(event, null, 2),
      attempts: [],
      isDelivered: false,
    })
    return event
  }

  /** One attempt; resolves with the status of the answer, or 0 when none came. */
  async deliver(eventId: string): Promise<number> {
    const record = need(this.records, eventId)
    const { url, secret, now } = this.#setting
    if (url === undefined) throw new Error('The payments fake was started without a webhook address')
    try {
      const response = await fetch(url, {
        method: 'POST',
        headers: {
          'content-type': 'application/json; charset=utf-8',
          'stripe-signature': signatureHeader(record.body, secret, now()),
        },
        body: record.body,
        redirect: 'manual',
        signal: AbortSignal.timeout(answerWithinMilliseconds),
      })
      await response.body?.cancel()
      record.attempts.push(response.status)
      record.isDelivered ||= response.ok
      return response.status
    } catch (error) {
      record.attempts.push(error instanceof Error ? error.message : 'no answer')
      return 0
    }
  }

  close(): void {
    this.#isClosed = true
    for (const timer of this.#timers) clearTimeout(timer)
    this.#timers.clear()
  }

  async #sendWithRetries(eventId: string, attempt = 0): Promise<void> {
    const copies = attempt === 0 ? this.mode.copies : 1
    await Promise.all(Array.from({ length: copies }, () => this.deliver(eventId)))
    const pause = this.#setting.retryDelaysMilliseconds[attempt]
    if (need(this.records, eventId).isDelivered || pause === undefined) return
    this.#after(pause, () => this.#sendWithRetries(eventId, attempt + 1))
  }

  async #sendGathered(): Promise<void> {
    for (const eventId of this.#gathered.splice(0).reverse()) await this.#sendWithRetries(eventId)
  }

  #after(milliseconds: number, act: () => Promise<void>): void {
    if (this.#isClosed) return
    const timer = setTimeout(() => {
      this.#timers.delete(timer)
      void act()
    }, milliseconds)
    this.#timers.add(timer)
  }
}
