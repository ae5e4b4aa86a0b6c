import 'server-only'

type Attachment = {
  readonly name: string
  readonly mediaType: string
  readonly sizeBytes?: number
  readonly body: ReadableStream<Uint8Array>
}

/**
 * A file for saving, never for showing: an attachment whose type is not guessed, in a sandbox should a browser open it
 * all the same, and kept by no cache.
 */
export function attachment({ name, mediaType, sizeBytes, body }: Attachment): Response {
  return new Response(body, {
    headers: {
      'content-type': mediaType,
      ...(sizeBytes === undefined ? {} : { 'content-length': String(sizeBytes) }),
      'content-disposition': dispositionOf(name),
      'x-content-type-options': 'nosniff',
      'content-security-policy': "sandbox; default-src 'none'",
      // Without a transformation the announced length stays true.
      'cache-control': 'private, no-store, no-transform',
    },
  })
}

/** RFC 6266: a plain ASCII name for old programs, the true one in UTF-8 (RFC 8187) for all others. */
export function dispositionOf(name: string): string {
  const plain = name.replace(/[^\x20-\x7E]/g, '_').replace(/["\\%]/g, '_')
  const encoded = encodeURIComponent(name).replace(
    /['()*]/g,
    (mark) => `%${mark.charCodeAt(0).toString(16).toUpperCase()}`,
  )
  return `attachment; filename="${plain}"; filename*=UTF-8''${encoded}`
}
