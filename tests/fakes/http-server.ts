import { createServer, type IncomingMessage, type ServerResponse } from 'node:http'
import { setTimeout as pause } from 'node:timers/promises'

export type FakeRequest = {
  readonly method: string
  readonly url: URL
  readonly headers: Readonly<Record<string, string>>
  readonly body: string
}

export type FakeReply = {
  readonly status: number
  readonly headers: Readonly<Record<string, string>>
  readonly body: string | Uint8Array
  readonly delayMilliseconds?: number
  /** The connection breaks: before the first byte of the answer, or in the middle of its body. */
  readonly cut?: 'before' | 'half_way'
}

export type Route = {
  readonly method: 'GET' | 'POST'
  /** The groups of the pattern are handed to `answer` in their order. */
  readonly path: RegExp
  readonly answer: (request: FakeRequest, ...groups: string[]) => FakeReply | Promise<FakeReply>
}

export type RunningServer = { readonly url: string; readonly close: () => Promise<void> }

export const json = (status: number, value: unknown, headers: Record<string, string> = {}): FakeReply => ({
  status,
  headers: { 'content-type': 'application/json', ...headers },
  body: JSON.stringify(value, null, 2),
})

export const redirect = (location: string): FakeReply => ({ status: 303, headers: { location }, body: '' })

/** Serves routes on this machine only; port 0 takes a free one. */
export async function serve(
  port: number,
  routes: readonly Route[],
  otherwise: FakeReply,
): Promise<RunningServer> {
  const server = createServer((incoming, response) => {
    answer(routes, otherwise, incoming, response).catch((error: unknown) => {
      process.stderr.write(`A fake failed to answer ${incoming.url ?? ''}: ${String(error)}\n`)
      response.writeHead(500).end()
    })
  })
  await new Promise<void>((resolve, reject) => {
    server.once('error', reject)
    server.listen(port, '127.0.0.1', resolve)
  })
  const address = server.address()
  if (address === null || typeof address === 'string') throw new Error('The fake has no port')
  return {
    url: `http://127.0.0.1:${address.port}`,
    close: () =>
      new Promise((resolve) => {
        server.close(() => resolve())
        server.closeAllConnections()
      }),
  }
}

async function answer(
  routes: readonly Route[],
  otherwise: FakeReply,
  incoming: IncomingMessage,
  response: ServerResponse,
): Promise<void> {
  const request = await readRequest(incoming)
  for (const route of routes) {
    const groups = route.path.exec(request.url.pathname)
    if (route.method !== request.method || groups === null) continue
    return send(await route.answer(request, ...groups.slice(1)), response)
  }
  return send(otherwise, response)
}

async function readRequest(incoming: IncomingMessage): Promise<FakeRequest> {
  const chunks: Buffer[] = []
  for await (const chunk of incoming) chunks.push(Buffer.from(chunk))
  const headers = Object.entries(incoming.headers).map(([name, value]) => [name, String(value)])
  return {
    method: incoming.method ?? 'GET',
    url: new URL(incoming.url ?? '/', 'http://127.0.0.1'),
    headers: Object.fromEntries(headers),
    body: Buffer.concat(chunks).toString('utf8'),
  }
}

async function send(reply: FakeReply, response: ServerResponse): Promise<void> {
  if (reply.delayMilliseconds) await pause(reply.delayMilliseconds, undefined, { ref: false })
  if (reply.cut === 'before') return void response.destroy()
  const body = Buffer.from(reply.body)
  response.writeHead(reply.status, { ...reply.headers, 'content-length': body.byteLength })
  if (reply.cut === undefined) return void response.end(body)
  response.write(body.subarray(0, Math.floor(body.byteLength / 2)), () => response.destroy())
}
