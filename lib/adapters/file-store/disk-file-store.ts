import { createHash } from 'node:crypto'
import { constants } from 'node:fs'
import { mkdir, open, readFile, rename, rm, type FileHandle } from 'node:fs/promises'
import path from 'node:path'

import { err, ok, type Result } from '@/lib/core/result'
import type { FileStore, StoredFile, StoreError } from '@/lib/ports/file-store'

const chunkBytes = 256 * 1024

/** Keeps files below one folder, spread over sub-folders by the first letters of their identifier. */
export function createDiskFileStore(folder: string): FileStore {
  const pathOf = (id: string): string => {
    if (!/^[0-9a-z][0-9a-z.-]{4,80}$/.test(id) || id.includes('..')) {
      throw new Error('A file identifier of ours was expected')
    }
    return path.join(/* turbopackIgnore: true */ folder, id.slice(0, 2), id)
  }
  return {
    pathOf,
    write: (id, body, limitBytes) => writeStream(pathOf(id), body, limitBytes),
    writeBytes: async (id, bytes) => {
      const written = await writeStream(pathOf(id), streamOf(bytes), bytes.byteLength)
      if (!written.ok) throw new Error(`Could not store a file of our own: ${written.error.code}`)
      return written.value
    },
    read: async (id) => readFile(pathOf(id)),
    readPart: (id, start, length) => readPart(pathOf(id), start, length),
    stream: (id) => readStream(pathOf(id)),
    remove: async (id) => rm(pathOf(id), { force: true }),
  }
}

/** Write beside, synchronise file and folder, rename: a file under its final name is always whole. */
async function writeStream(
  target: string,
  body: ReadableStream<Uint8Array>,
  limitBytes: number,
): Promise<Result<StoredFile, StoreError>> {
  const folder = path.dirname(target)
  await mkdir(folder, { recursive: true })
  const unfinished = `${target}.part`
  const file = await open(unfinished, 'w')
  try {
    const stored = await pump(body, file, limitBytes)
    if (!stored.ok) return await abandon(file, unfinished, stored.error)
    await file.sync()
    await file.close()
    await rename(unfinished, target)
    await syncFolder(folder)
    return stored
  } catch (error) {
    return abandon(file, unfinished, { code: isDiskFull(error) ? 'no_space' : 'interrupted' })
  }
}

async function pump(
  body: ReadableStream<Uint8Array>,
  file: FileHandle,
  limitBytes: number,
): Promise<Result<StoredFile, StoreError>> {
  const hash = createHash('sha256')
  let sizeBytes = 0
  for await (const chunk of body) {
    sizeBytes += chunk.byteLength
    if (sizeBytes > limitBytes) return err({ code: 'too_large', limitBytes })
    hash.update(chunk)
    await writeWhole(file, chunk)
  }
  return ok({ sizeBytes, sha256: hash.digest('hex') })
}

async function writeWhole(file: FileHandle, chunk: Uint8Array): Promise<void> {
  let written = 0
  while (written < chunk.byteLength) {
    const { bytesWritten } = await file.write(chunk, written)
    written += bytesWritten
  }
}

async function abandon(
  file: FileHandle,
  unfinished: string,
  error: StoreError,
): Promise<Result<never, StoreError>> {
  await file.close().catch(() => undefined)
  await rm(unfinished, { force: true })
  return err(error)
}

async function syncFolder(folder: string): Promise<void> {
  const handle = await open(folder, constants.O_RDONLY)
  await handle.sync()
  await handle.close()
}

function isDiskFull(error: unknown): boolean {
  return error instanceof Error && 'code' in error && (error.code === 'ENOSPC' || error.code === 'EDQUOT')
}

function streamOf(bytes: Uint8Array): ReadableStream<Uint8Array> {
  return new ReadableStream({
    start(controller) {
      controller.enqueue(bytes)
      controller.close()
    },
  })
}

async function readPart(file: string, start: number, length: number): Promise<Uint8Array> {
  const handle = await open(file, 'r')
  try {
    const bytes = new Uint8Array(length)
    let filled = 0
    while (filled < length) {
      const { bytesRead } = await handle.read(bytes, filled, length - filled, start + filled)
      if (bytesRead === 0) break
      filled += bytesRead
    }
    return bytes.subarray(0, filled)
  } finally {
    await handle.close()
  }
}

function readStream(file: string): ReadableStream<Uint8Array> {
  let handle: FileHandle | undefined
  const source: UnderlyingSource<Uint8Array> = {
    async pull(controller) {
      handle ??= await open(file, 'r')
      const { bytesRead, buffer } = await handle.read(new Uint8Array(chunkBytes), 0, chunkBytes)
      if (bytesRead > 0) return controller.enqueue(buffer.subarray(0, bytesRead))
      await handle.close()
      controller.close()
    },
    async cancel() {
      await handle?.close()
    },
  }
  // Without a queue of its own nothing is opened before somebody reads.
  return new ReadableStream(source, { highWaterMark: 0 })
}
