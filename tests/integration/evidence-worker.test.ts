import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import path from 'node:path'

import { build } from 'esbuild'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'

import { createCaptureWorker } from '@/lib/adapters/capture-worker/capture-worker'
import { createDiskFileStore } from '@/lib/adapters/file-store/disk-file-store'
import { readSamples } from '@/lib/domain/evidence/channel-samples'

import { bytesOf, captureText } from '../support/sample-files'

let folder: string
let files: ReturnType<typeof createDiskFileStore>
let worker: ReturnType<typeof createCaptureWorker>

const root = process.cwd()

beforeAll(async () => {
  folder = mkdtempSync(path.join(tmpdir(), 'quellbench-worker-'))
  const workerFile = path.join(folder, 'analyse-capture.mjs')
  await build({
    entryPoints: [path.join(root, 'lib/workers/analyse-capture.worker.ts')],
    outfile: workerFile,
    bundle: true,
    platform: 'node',
    format: 'esm',
    alias: { '@': root },
  })
  files = createDiskFileStore(path.join(folder, 'files'))
  worker = createCaptureWorker(files, workerFile)
})

afterAll(async () => {
  await worker.close()
  rmSync(folder, { recursive: true, force: true })
})

/** The longest time that a timer of one millisecond was held up while `work` ran. */
async function longestHoldUp(work: Promise<unknown>): Promise<number> {
  let longest = 0
  let last = performance.now()
  const timer = setInterval(() => {
    const now = performance.now()
    longest = Math.max(longest, now - last)
    last = now
  }, 1)
  await work
  clearInterval(timer)
  return longest
}

describe('UP7: the worker that reads captures', () => {
  it('answers with what it recognised and leaves the samples in the store', async () => {
    await files.writeBytes('capture-one', bytesOf(captureText({ samples: 1000, spikeAt: 7 })))
    const result = await worker.analyse('capture-one')
    expect(result).toMatchObject({
      ok: true,
      value: { samples: 1000, channels: [{ name: 'SW', maximum: 99 }] },
    })
    expect([...(await readSamples(files, 'capture-one', 0, 6, 3))]).toEqual([0.06, 99, 0.08])
  })

  it('answers a file that is no capture with the sentence of the parser', async () => {
    await files.writeBytes('capture-two', bytesOf(captureText().replace('\n50e-9,0.5\n', '\n50e-9,half\n')))
    const refused = await worker.analyse('capture-two')
    expect(refused).toMatchObject({
      ok: false,
      error: { code: 'not_readable', message: expect.stringContaining('Row 52, column 2 holds “half”') },
    })
  })

  it('reads a million samples without holding up the request loop', async () => {
    await files.writeBytes('capture-big', bytesOf(captureText({ samples: 1_000_000 })))
    const analysis = worker.analyse('capture-big')
    const holdUp = await longestHoldUp(analysis)
    expect(await analysis).toMatchObject({ ok: true, value: { samples: 1_000_000 } })
    expect(holdUp).toBeLessThan(150)
  })
})
