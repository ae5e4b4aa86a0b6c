import { createHash } from 'node:crypto'
import { readdirSync } from 'node:fs'
import path from 'node:path'

import { afterEach, beforeEach, describe, expect, it } from 'vitest'

import { removeClient } from '@/lib/domain/engagements/people.service'
import { capturePoints } from '@/lib/domain/evidence/capture.service'
import {
  getEvidence,
  listEvidence,
  openEvidenceFile,
  stateFacts,
} from '@/lib/domain/evidence/evidence.service'
import { announceUpload, receiveEvidence } from '@/lib/domain/evidence/upload.service'

import { openTestEngagement, type TestEngagement } from '../support/engagement'
import { sendCapture, sendEvidence, type SentFile } from '../support/evidence'
import { bytesOf, pdfBytes, pngBytes, streamOf, zipBytes } from '../support/sample-files'
import { openTestPortal, type TestPortal } from '../support/test-portal'
import { valueOf } from '../support/value-of'

let portal: TestPortal
let osterby: TestEngagement

beforeEach(async () => {
  portal = await openTestPortal()
  osterby = await openTestEngagement(portal)
})

afterEach(() => portal.close())

const send = (file: SentFile) => sendEvidence(portal, osterby, file)

const read = async (evidenceId: string) =>
  valueOf(await getEvidence.execute(portal.deps, osterby.engineer, { evidenceId }))

/** Every file below the folder of the portal but the database itself. */
const filesOf = (folder: string): string[] =>
  readdirSync(folder, { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile() && !entry.name.startsWith('portal.sqlite'))
    .map((entry) => path.join(entry.parentPath, entry.name))

const storedRows = () => portal.db.selectFrom('evidence').selectAll().execute()

describe('taking a file in', () => {
  it('keeps the very bytes under an id of ours, with their SHA-256, sender and instant', async () => {
    const bytes = pdfBytes()
    const { evidenceId } = valueOf(await send({ name: 'schematic.pdf', bytes }))
    const file = await read(evidenceId)
    expect(file).toMatchObject({
      name: 'schematic.pdf',
      kind: 'document',
      status: 'ready',
      sizeBytes: bytes.byteLength,
      sha256: createHash('sha256').update(bytes).digest('hex'),
      uploadedBy: osterby.engineer.name,
      uploadedAt: portal.clock.now(),
      number: 1,
    })
    const opened = valueOf(await openEvidenceFile.execute(portal.deps, osterby.engineer, { evidenceId }))
    expect(new Uint8Array(await new Response(opened.body).arrayBuffer())).toEqual(bytes)
  })

  it.each([
    ['board.png', pngBytes(), 'picture'],
    ['gerbers.zip', zipBytes(), 'attachment'],
    ['choke.s2p', bytesOf('! measured\n# MHz S RI R 50\n1 0 0 1 0 1 0 0 0\n'), 'attachment'],
    [
      'power-stage.svg',
      bytesOf('<?xml version="1.0"?><svg xmlns="http://www.w3.org/2000/svg"/>'),
      'document',
    ],
  ])('takes %s in as what it is', async (name, bytes, kind) => {
    const { evidenceId } = valueOf(await send({ name, bytes }))
    expect((await read(evidenceId)).kind).toBe(kind)
  })

  it('numbers the files of an engagement one after another, also when they come at once', async () => {
    const sent = await Promise.all([1, 2, 3].map(() => send({ name: 'a.pdf', bytes: pdfBytes() })))
    expect(sent.map((result) => valueOf(result).number).sort()).toEqual([1, 2, 3])
    const listed = valueOf(
      await listEvidence.execute(portal.deps, osterby.consultant, { engagementId: osterby.engagementId }),
    )
    expect(listed.map((file) => file.number)).toEqual([3, 2, 1])
  })

  it('says beforehand whether a file would be taken in', async () => {
    const announce = (name: string, sizeBytes: number) =>
      announceUpload.execute(portal.deps, osterby.engineer, {
        engagementId: osterby.engagementId,
        name,
        sizeBytes,
      })
    expect(await announce('scope.csv', 1000)).toMatchObject({ ok: true })
    expect(await announce('tool.exe', 1000)).toMatchObject({ error: { code: 'kind_not_accepted' } })
    expect(await announce('scope.csv', 0)).toMatchObject({ error: { code: 'empty_file' } })
    expect(await announce('board.zip', 64 * 1024 * 1024 + 1)).toMatchObject({ error: { code: 'too_large' } })
    expect(filesOf(portal.folder)).toEqual([])
  })
})

describe('UP1: what a file is, its bytes decide together with its name', () => {
  const png = pngBytes()
  it.each([
    ['empty.pdf', new Uint8Array(0), 'empty_file'],
    ['one-byte.pdf', new Uint8Array([0x25]), 'content_differs'],
    ['one-byte.png', new Uint8Array([0x89]), 'content_differs'],
    ['picture.pdf', png, 'content_differs'],
    ['document.png', pdfBytes(), 'content_differs'],
    ['capture.csv', png, 'content_differs'],
    ['capture.csv', bytesOf('t,v\n0,1\u0000\n1,2\n'), 'content_differs'],
    ['broken-off.pdf', pdfBytes().slice(0, 40), 'content_differs'],
    ['broken-off.png', png.slice(0, 40), 'content_differs'],
    ['broken-off.zip', zipBytes().slice(0, 30), 'content_differs'],
    ['photo.jpg', bytesOf('\u00ff\u00d8\u00ff no frame'), 'content_differs'],
    ['script.html', bytesOf('<script>alert(1)</script>'), 'kind_not_accepted'],
    ['tool.pdf.exe', pdfBytes(), 'kind_not_accepted'],
    ['tool.exe.pdf', bytesOf('MZ this is a program'), 'content_differs'],
    ['no-ending', pdfBytes(), 'kind_not_accepted'],
    ['.pdf', pdfBytes(), 'kind_not_accepted'],
    ['drawing.svg', bytesOf('<html><body>no drawing</body></html>'), 'content_differs'],
    ['choke.s1p', bytesOf('just some words\n'), 'content_differs'],
  ])('%s is refused and leaves nothing behind', async (name, bytes, code) => {
    const refused = await send({ name, bytes })
    expect(refused).toMatchObject({ ok: false, error: { code } })
    expect(filesOf(portal.folder)).toEqual([])
    expect(await storedRows()).toEqual([])
  })

  it('a file that is a picture and an archive in one is kept as the picture that its name says', async () => {
    const both = new Uint8Array([...png, ...zipBytes()])
    const { evidenceId } = valueOf(await send({ name: 'board.png', bytes: both }))
    const opened = valueOf(await openEvidenceFile.execute(portal.deps, osterby.engineer, { evidenceId }))
    expect(opened.mediaType).toBe('image/png')
  })

  it('a table of words is kept, marked as not readable, with the sentence that says what to do', async () => {
    const received = valueOf(
      await send({ name: 'notes.txt', bytes: bytesOf('we changed the gate resistor\nand it got better\n') }),
    )
    expect(received).toMatchObject({ status: 'refused', refusal: expect.stringContaining('numbers') })
    const file = await read(received.evidenceId)
    expect(file).toMatchObject({ status: 'refused', refusal: received.refusal, capture: null })
  })
})

describe('UP2: how much is taken in', () => {
  const limit = 5000
  const withLimit = () => ({
    ...portal.deps,
    settings: { ...portal.deps.settings, uploadLimitBytes: limit },
  })
  const sizedPdf = (size: number) => pdfBytes(size)

  it.each([
    { size: limit - 1, isTaken: true },
    { size: limit, isTaken: true },
    { size: limit + 1, isTaken: false },
  ])('a file of $size bytes under a limit of 5000: $isTaken', async ({ size, isTaken }) => {
    const bytes = sizedPdf(size)
    expect(bytes).toHaveLength(size)
    const sent = await receiveEvidence.execute(withLimit(), osterby.engineer, {
      engagementId: osterby.engagementId,
      name: 'big.pdf',
      contentLength: size,
      body: streamOf(bytes),
    })
    expect(sent.ok).toBe(isTaken)
    if (!isTaken) expect(sent).toMatchObject({ error: { code: 'too_large' } })
    expect(filesOf(portal.folder)).toHaveLength(isTaken ? 1 : 0)
  })

  it.each([1, -1, 1000])('a body that differs from its announced length by %i is not kept', async (by) => {
    const bytes = pdfBytes()
    const sent = await send({ name: 'a.pdf', bytes, announced: bytes.byteLength + by })
    expect(sent).toMatchObject({ error: { code: 'length_mismatch' } })
    expect(filesOf(portal.folder)).toEqual([])
  })

  it('a body without an announced length is not read', async () => {
    const sent = await send({ name: 'a.pdf', bytes: pdfBytes(), announced: null })
    expect(sent).toMatchObject({ error: { code: 'length_needed' } })
  })

  it('a body that never ends is cut at its announced length and its source is told to stop', async () => {
    let pulled = 0
    let isCancelled = false
    const endless = new ReadableStream<Uint8Array>({
      pull: (controller) => {
        pulled += 1
        controller.enqueue(new Uint8Array(64 * 1024))
      },
      cancel: () => {
        isCancelled = true
      },
    })
    const sent = await send({ name: 'a.pdf', bytes: new Uint8Array(0), announced: 100_000, body: endless })
    expect(sent).toMatchObject({ error: { code: 'length_mismatch' } })
    expect(pulled).toBeLessThan(10)
    expect(isCancelled).toBe(true)
    expect(filesOf(portal.folder)).toEqual([])
  })

  it('a body that breaks off leaves nothing behind', async () => {
    const broken = new ReadableStream<Uint8Array>({
      start: (controller) => controller.enqueue(pdfBytes()),
      pull: (controller) => controller.error(new Error('connection reset')),
    })
    const sent = await send({ name: 'a.pdf', bytes: new Uint8Array(0), announced: 100_000, body: broken })
    expect(sent).toMatchObject({ error: { code: 'interrupted' } })
    expect(filesOf(portal.folder)).toEqual([])
  })

  it('a person who is taken off while the file is on its way does not get it in', async () => {
    const bytes = pdfBytes()
    const slow = new ReadableStream<Uint8Array>({
      pull: async (controller) => {
        await removeClient.execute(portal.deps, osterby.purchaser, {
          engagementId: osterby.engagementId,
          personId: osterby.engineer.personId,
        })
        controller.enqueue(bytes)
        controller.close()
      },
    })
    expect(await send({ name: 'a.pdf', bytes, body: slow })).toMatchObject({ error: { code: 'not_found' } })
    expect(filesOf(portal.folder)).toEqual([])
  })
})

describe('UP3: a name is data only', () => {
  it.each([
    ['../../../etc/passwd.pdf', 'passwd.pdf'],
    ['..\\..\\windows\\boot.pdf', 'boot.pdf'],
    ['/etc/cron.d/job.pdf', 'job.pdf'],
    ['C:\\Users\\x\\scope.pdf', 'scope.pdf'],
    ['layout\u202Efdp.pdf', 'layoutfdp.pdf'],
    ['  spaced.pdf ', 'spaced.pdf'],
    ['<img src=x onerror=alert(1)>.pdf', '<img src=x onerror=alert(1)>.pdf'],
    ['Schaltplan für µC.PDF', 'Schaltplan für µC.PDF'],
  ])('%j is kept as %j', async (sent, kept) => {
    const { evidenceId, name } = valueOf(await send({ name: sent, bytes: pdfBytes() }))
    expect(name).toBe(kept)
    const [file, ...others] = filesOf(portal.folder)
    expect(others).toEqual([])
    expect(file).toBe(path.join(portal.folder, 'files', evidenceId.slice(0, 2), evidenceId))
  })

  it.each([
    `${'n'.repeat(300)}.pdf`,
    'nul\u0000.pdf',
    'two\r\nlines.pdf',
    '\u001b[31mred.pdf',
    '',
    '..',
    '\u202E',
  ])('%j is refused', async (name) => {
    const sent = await send({ name, bytes: pdfBytes() })
    expect(sent).toMatchObject({ ok: false })
    expect(filesOf(portal.folder)).toEqual([])
  })
})

describe('AZ2: foreign evidence', () => {
  it('answers every step exactly as an unknown id', async () => {
    const larkfield = await openTestEngagement(portal, 'Larkfield Rail Sensors')
    const { evidenceId } = await sendCapture(portal, osterby)
    const unknownId = portal.deps.ids.newId()
    for (const actor of [larkfield.purchaser, larkfield.engineer, larkfield.consultant]) {
      const answers = (file: string, engagementId: string) =>
        Promise.all([
          getEvidence.execute(portal.deps, actor, { evidenceId: file }),
          openEvidenceFile.execute(portal.deps, actor, { evidenceId: file }),
          capturePoints.execute(portal.deps, actor, { evidenceId: file }),
          stateFacts.execute(portal.deps, actor, { evidenceId: file }),
          listEvidence.execute(portal.deps, actor, { engagementId }),
          announceUpload.execute(portal.deps, actor, { engagementId, name: 'a.pdf', sizeBytes: 9 }),
          receiveEvidence.execute(portal.deps, actor, {
            engagementId,
            name: 'a.pdf',
            contentLength: pdfBytes().length,
            body: streamOf(pdfBytes()),
          }),
        ])
      const foreign = await answers(evidenceId, osterby.engagementId)
      expect(foreign).toEqual(await answers(unknownId, unknownId))
      expect(foreign.every((answer) => !answer.ok && answer.error.code === 'not_found')).toBe(true)
    }
    expect(await storedRows()).toHaveLength(1)
  })

  it('is closed to an administrator who is not on the engagement', async () => {
    const { evidenceId } = await sendCapture(portal, osterby)
    const { administrator, engagementId } = osterby
    expect(await getEvidence.execute(portal.deps, administrator, { evidenceId })).toMatchObject({
      error: { code: 'not_permitted' },
    })
    expect(await listEvidence.execute(portal.deps, administrator, { engagementId })).toMatchObject({
      error: { code: 'not_permitted' },
    })
  })
})
