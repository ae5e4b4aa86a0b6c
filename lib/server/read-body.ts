import 'server-only'

import { err, ok, type Result } from '@/lib/core/result'
import type { ServiceError } from '@/lib/domain/service-error'

/** The whole body in memory, refused as soon as it is larger than the limit, whatever its declared length. */
export async function readBody(
  request: Request,
  limitBytes: number,
): Promise<Result<Uint8Array, ServiceError<'too_large' | 'invalid_input'>>> {
  if (!request.body) return err({ code: 'invalid_input', message: 'Choose a file first.' })
  const chunks: Uint8Array[] = []
  let size = 0
  for await (const chunk of request.body) {
    size += chunk.byteLength
    if (size > limitBytes) {
      const limit = Math.floor(limitBytes / 1024 ** 2)
      return err({ code: 'too_large', message: `The file is larger than ${limit} MiB, which no report is.` })
    }
    chunks.push(chunk)
  }
  return ok(new Uint8Array(Buffer.concat(chunks)))
}
