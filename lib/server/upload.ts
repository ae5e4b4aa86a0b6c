import 'server-only'

/** What the headers of an upload say about its body. A name that does not decode is taken as it stands. */
export function uploadOf(request: Request) {
  const length = request.headers.get('content-length')
  return {
    name: decoded(request.headers.get('x-file-name') ?? ''),
    contentLength: length !== null && /^\d{1,15}$/.test(length) ? Number(length) : null,
    body: request.body ?? emptyBody(),
  }
}

/** The announcement in the body; anything that is not one reaches the schema as it is and is refused there. */
export async function announcementOf(request: Request): Promise<object> {
  const body: unknown = await request.json().catch(() => null)
  return typeof body === 'object' && body !== null ? body : {}
}

function decoded(name: string): string {
  try {
    return decodeURIComponent(name)
  } catch {
    return name
  }
}

const emptyBody = () => new ReadableStream<Uint8Array>({ start: (controller) => controller.close() })
