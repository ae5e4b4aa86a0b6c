import { createHash } from 'node:crypto'
import { existsSync, mkdtempSync, readdirSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import path from 'node:path'

import { afterEach, beforeEach, describe, expect, it } from 'vitest'

import { createDiskFileStore } from '@/lib/adapters/file-store/disk-file-store'
import { randomIds } from '@/lib/adapters/random-ids/random-ids'

let folder: string

beforeEach(() => {
  folder = mkdtempSync(path.join(tmpdir(), 'quellbench-store-'))
})

afterEach(() => rmSync(folder, { recursive: true, force: true }))

function bodyOf(...chunks: Uint8Array[]): ReadableStream<Uint8Array> {
  return new ReadableStream({
    start(controller) {
      for (const chunk of chunks) controller.enqueue(chunk)
      controller.close()
    },
  })
}

const files = () => readdirSync(folder, { recursive: true }).map(String)

describe('the file store', () => {
  it('UP6: keeps the bytes and the SHA-256 taken while writing', async () => {
    const store = createDiskFileStore(folder)
    const id = randomIds.newId()
    const bytes = new Uint8Array(700_000).map((_, index) => index % 251)
    const written = await store.write(id, bodyOf(bytes.subarray(0, 10), bytes.subarray(10)), 1e6)
    const sha256 = createHash('sha256').update(bytes).digest('hex')
    expect(written).toEqual({ ok: true, value: { sizeBytes: 700_000, sha256 } })
    const parts: Uint8Array[] = []
    for await (const chunk of store.stream(id)) parts.push(chunk)
    expect(Buffer.concat(parts).equals(Buffer.from(bytes))).toBe(true)
  })

  it.each([
    { size: 99, ok: true },
    { size: 100, ok: true },
    { size: 101, ok: false },
  ])('UP2: $size bytes under a limit of 100: $ok', async ({ size, ok }) => {
    const store = createDiskFileStore(folder)
    const written = await store.write(randomIds.newId(), bodyOf(new Uint8Array(size)), 100)
    expect(written.ok).toBe(ok)
    expect(files().filter((name) => name.endsWith('.part'))).toEqual([])
  })

  it('UP2: stops a body that never ends at the limit', async () => {
    let sent = 0
    const endless = new ReadableStream<Uint8Array>({
      pull(controller) {
        sent += 1000
        controller.enqueue(new Uint8Array(1000))
      },
    })
    const written = await createDiskFileStore(folder).write(randomIds.newId(), endless, 10_000)
    expect(written).toMatchObject({ error: { code: 'too_large', limitBytes: 10_000 } })
    expect(sent).toBeLessThan(20_000)
  })

  it('UP6: leaves nothing of a body that breaks off', async () => {
    const broken = new ReadableStream<Uint8Array>({
      start(controller) {
        controller.enqueue(new Uint8Array(10))
        controller.error(new Error('connection lost'))
      },
    })
    const written = await createDiskFileStore(folder).write(randomIds.newId(), broken, 100)
    expect(written).toMatchObject({ error: { code: 'interrupted' } })
    expect(files().filter((name) => name.includes('.'))).toEqual([])
  })

  it.each(['../outside', '/etc/passwd', 'C:\\x', 'a/b', '..', 'ab..cd/x', 'name\u0000x'])(
    'UP3: refuses %j as an identifier',
    (id) => {
      expect(() => createDiskFileStore(folder).pathOf(id)).toThrow('identifier of ours')
      expect(existsSync(path.join(folder, '..', 'outside'))).toBe(false)
    },
  )
})
