import 'server-only'

import { channelFileOf } from '@/lib/ports/capture-analyser'
import type { FileStore } from '@/lib/ports/file-store'

const bytesPerSample = Float64Array.BYTES_PER_ELEMENT

/** `count` samples of one channel from sample `first` on, in the channel's unit; fewer where the record ends. */
export async function readSamples(
  files: FileStore,
  evidenceId: string,
  channel: number,
  first: number,
  count: number,
): Promise<Float64Array> {
  return readDoubles(files, channelFileOf(evidenceId, channel), first, count)
}

/** `count` doubles of a stored file from the one numbered `first` on; fewer where the file ends. */
export async function readDoubles(
  files: FileStore,
  id: string,
  first: number,
  count: number,
): Promise<Float64Array> {
  const bytes = await files.readPart(id, first * bytesPerSample, count * bytesPerSample)
  return new Float64Array(bytes.buffer, bytes.byteOffset, Math.floor(bytes.byteLength / bytesPerSample))
}
