import { z } from 'zod'

import { json, serve, type FakeReply, type FakeRequest, type Route } from '../http-server'
import { createIdempotency } from '../idempotency'
import { pageAssets } from '../page'
import { createTroubleQueue, type TroubleQueue } from '../trouble'
import { messageInput, messageOf, messagesTo, type FakeMessage } from './messages'
import { messageHtml, messagePage, noSuchMessage, outboxPage } from './outbox-pages'

export type ResendFake = {
  readonly url: string
  readonly close: () => Promise<void>
  /** Newest first; only those to an address that contains `to`, when it is given. */
  readonly messages: (to?: string) => readonly FakeMessage[]
  readonly clear: () => void
  readonly troubles: TroubleQueue
}

const problem = (statusCode: number, name: string, message: string) => ({ statusCode, name, message })

const refusal = (...about: Parameters<typeof problem>): FakeReply => json(about[0], problem(...about))

const planned = (...about: Parameters<typeof problem>) =>
  ({ kind: 'status', status: about[0], body: problem(...about) }) as const

/** Answers of the service that say no, for `troubles.plan`. */
export const refusals = {
  refused: planned(422, 'validation_error', 'The recipient is not accepted.'),
  busy: planned(429, 'rate_limit_exceeded', 'Too many requests.'),
  broken: planned(500, 'internal_server_error', 'Something broke.'),
}

export async function startResendFake({ port }: { readonly port: number }): Promise<ResendFake> {
  const messages: FakeMessage[] = []
  const troubles = createTroubleQueue()
  const server = await serve(
    port,
    [sendRoute(messages, troubles), ...readRoutes(messages), ...pageAssets],
    noSuchMessage,
  )
  return {
    ...server,
    messages: (to = '') => messagesTo(messages, to),
    clear: () => void messages.splice(0),
    troubles,
  }
}

function sendRoute(messages: FakeMessage[], troubles: TroubleQueue): Route {
  const once = createIdempotency(() =>
    refusal(409, 'invalid_idempotent_request', 'This idempotency key was used with another message before.'),
  )
  const accept = (request: FakeRequest): FakeReply => {
    const input = messageInput.safeParse(jsonOf(request.body))
    if (!input.success) return refusal(422, 'validation_error', z.prettifyError(input.error))
    const message = messageOf(input.data)
    messages.push(message)
    return json(200, { id: message.id })
  }
  return {
    method: 'POST',
    path: /^\/emails$/,
    answer: (request) => {
      if (!/^Bearer re_\w+$/.test(request.headers.authorization ?? ''))
        return refusal(401, 'missing_api_key', 'This fake takes keys that begin with re_.')
      return troubles.around(() =>
        once(request.headers['idempotency-key'], request.body, () => accept(request)),
      )
    },
  }
}

function readRoutes(messages: readonly FakeMessage[]): readonly Route[] {
  const recipient = (request: FakeRequest) => request.url.searchParams.get('to') ?? ''
  const withMessage = (id: string, show: (message: FakeMessage) => FakeReply): FakeReply => {
    const message = messages.find((one) => one.id === id)
    return message === undefined ? noSuchMessage : show(message)
  }
  return [
    {
      method: 'GET',
      path: /^\/$/,
      answer: (request) => outboxPage(messagesTo(messages, recipient(request)), recipient(request)),
    },
    {
      method: 'GET',
      path: /^\/messages\/([^/]+)$/,
      answer: (_request, id = '') => withMessage(id, messagePage),
    },
    {
      method: 'GET',
      path: /^\/messages\/([^/]+)\/html$/,
      answer: (_request, id = '') => withMessage(id, messageHtml),
    },
    {
      method: 'GET',
      path: /^\/api\/messages$/,
      answer: (request) => json(200, messagesTo(messages, recipient(request))),
    },
  ]
}

function jsonOf(text: string): unknown {
  try {
    return JSON.parse(text)
  } catch {
    return undefined
  }
}
