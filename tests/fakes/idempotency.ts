import type { FakeReply } from './http-server'

/** Remembers what was answered under each key, so that a repeated request is answered without being done again. */
export function createIdempotency(clash: () => FakeReply) {
  const known = new Map<string, { readonly request: string; readonly reply: FakeReply }>()
  return (key: string | undefined, request: string, act: () => FakeReply): FakeReply => {
    if (key === undefined) return act()
    const earlier = known.get(key)
    if (earlier !== undefined) return earlier.request === request ? earlier.reply : clash()
    const reply = act()
    // A refusal did nothing that could be repeated by mistake; only what was done is kept.
    if (reply.status < 400) known.set(key, { request, reply })
    return reply
  }
}
