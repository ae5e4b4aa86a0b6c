import { PDFDocument, PDFName, PDFRef } from '@cantoo/pdf-lib'
import { beforeAll, describe, expect, it } from 'vitest'

import { signPdf } from '@/lib/signature/sign-pdf'
import { issueSigningCertificate } from '@/lib/signature/signing-certificate'
import { verifyPdf } from '@/lib/signature/verify-pdf'
import type { ProblemCode } from '@/lib/signature/verifying/verdict'

import {
  createReport,
  createScene,
  drawExtraText,
  expectationOf,
  NOW,
  requestFor,
  signByBoth,
  signWithoutChecks,
  type SigningScene,
  updateWith,
  valueOf,
} from './signing-scene'

const latin1 = (bytes: Uint8Array): string => Buffer.from(bytes).toString('latin1')
const fromLatin1 = (text: string): Uint8Array => Uint8Array.from(Buffer.from(text, 'latin1'))

describe('verifying a signed report', () => {
  let scene: SigningScene
  let once: Uint8Array
  let twice: Uint8Array
  beforeAll(async () => {
    scene = await createScene()
    ;({ once, twice } = await signByBoth(scene))
  })

  const problemsOf = (pdf: Uint8Array, input = expectationOf(scene)) => {
    const verdict = verifyPdf(pdf, input)
    expect(verdict.valid).toBe(false)
    for (const { sentence } of verdict.problems) expect(sentence).toMatch(/^\S.*\.$/)
    return verdict.problems
  }

  const expectProblem = (pdf: Uint8Array, code: ProblemCode, words: RegExp, input = expectationOf(scene)) =>
    expect(problemsOf(pdf, input)).toContainEqual(
      expect.objectContaining({ code, sentence: expect.stringMatching(words) }),
    )

  it('BZ3: notices a flipped bit in each of 64 bytes spread over the file', () => {
    for (let index = 0; index < 64; index++) {
      const flipped = Uint8Array.from(twice)
      const offset = Math.floor((index * (twice.length - 1)) / 63)
      flipped[offset] = (flipped[offset] ?? 0) ^ (1 << (index % 8))
      expect(verifyPdf(flipped, expectationOf(scene)).valid, `byte ${offset}`).toBe(false)
    }
  })

  it('BZ3: notices flipped bits in both signature containers and in the zeros behind them', () => {
    const places = [...latin1(twice).matchAll(/\/Contents <([0-9a-f]+?)(0{100,})>/g)]
    expect(places).toHaveLength(2)
    for (const place of places) {
      const start = place.index + '/Contents <'.length
      const used = place[1]?.length ?? 0
      const offsets = Array.from({ length: 40 }, (_, index) => start + Math.floor((index * used) / 40))
      for (const offset of [...offsets, start + used + 50, start + 8191]) {
        const flipped = Uint8Array.from(twice)
        flipped[offset] = (flipped[offset] ?? 0) ^ (offset % 2 ? 0x01 : 0x20)
        expect(verifyPdf(flipped, expectationOf(scene)).valid, `byte ${offset}`).toBe(false)
      }
    }
  })

  it('refuses a container whose certificate of the authority cannot be read', () => {
    const curve = '06082a8648ce3d030107'
    expect(latin1(twice).split(curve)).toHaveLength(5)
    for (const index of [1, 2, 3, 4]) {
      const parts = latin1(twice).split(curve)
      const damaged = `${parts.slice(0, index).join(curve)}06082a8648ce3d030106${parts.slice(index).join(curve)}`
      const verdict = verifyPdf(fromLatin1(damaged), expectationOf(scene))
      expect(verdict.valid).toBe(false)
      expect(verdict.problems.length).toBeGreaterThan(0)
    }
  })

  it('BZ3: notices text that was added between the two signatures', async () => {
    const changed = await updateWith(once, drawExtraText)
    const signed = await signWithoutChecks(changed, requestFor(scene, 'reviewer'))
    expectProblem(signed, 'changes', /was changed beyond adding this signature: it was saved in between/)
  })

  it('BZ3: notices text that was added in the same save as the second signature', async () => {
    const signed = await signWithoutChecks(once, requestFor(scene, 'reviewer'), drawExtraText)
    expectProblem(signed, 'changes', /object \d+ was changed/)
  })

  it('notices an object that came with the second signature but is no part of it', async () => {
    const signed = await signWithoutChecks(once, requestFor(scene, 'reviewer'), (document) => {
      document.context.register(document.context.obj({ Type: 'Annot' }))
    })
    expectProblem(signed, 'changes', /object \d+ was added, which is no part of the signature/)
  })

  it('notices a changed catalogue in the save of the second signature', async () => {
    const signed = await signWithoutChecks(once, requestFor(scene, 'reviewer'), (document) => {
      document.catalog.set(PDFName.of('OpenAction'), document.context.obj({ S: 'JavaScript' }))
    })
    expectProblem(signed, 'changes', /object \d+ was changed/)
  })

  it('notices content that the first signer signed as missing and the second one fills in', async () => {
    const prepared = await updateWith(await createReport(), (document) => {
      const missing = Array.from({ length: 200 }, (_, index) => PDFRef.of(index + 20))
      document.getPage(0).node.set(PDFName.of('PieceInfo'), document.context.obj(missing))
    })
    const first = valueOf(await signPdf(prepared, requestFor(scene, 'author')))
    const second = valueOf(await signPdf(first, requestFor(scene, 'reviewer')))
    expectProblem(second, 'changes', /content that an earlier state had left open was filled in/)
  })

  it('BZ3: notices text that was added after the last signature', async () => {
    expectProblem(
      await updateWith(twice, drawExtraText),
      'changed_after_signing',
      /added to the file after the last/,
    )
  })

  it('notices appended bytes, white space too', () => {
    expectProblem(
      Buffer.concat([twice, Buffer.from('\n')]),
      'changed_after_signing',
      /after the last signature/,
    )
    expectProblem(Buffer.concat([twice, Buffer.from('% more')]), 'unreadable', /end mark/)
  })

  it('notices a truncated file, wherever it is cut', () => {
    for (let index = 1; index < 32; index++) {
      const cut = twice.subarray(0, Math.floor((index * twice.length) / 32))
      expect(verifyPdf(cut, expectationOf(scene)).valid).toBe(false)
    }
    expectProblem(twice.subarray(0, twice.length - 10), 'unreadable', /end mark is missing/)
  })

  it('asks for every required signature', () => {
    expectProblem(once, 'signature_missing', /required signature "reviewer" is missing/)
  })

  it('says when a PDF is not signed at all', async () => {
    expectProblem(await createReport(), 'not_signed', /carries no signature/)
  })

  it('refuses a signature that the report should not have', () => {
    expectProblem(twice, 'unexpected_field', /"reviewer"/, expectationOf(scene, ['author']))
  })

  it('refuses a certificate of another authority, even under the same names', async () => {
    const other = await createScene()
    const theirs = await signByBoth(other)
    expectProblem(theirs.twice, 'issuer', /not issued by the practice/, {
      ...expectationOf(other),
      authorityCertificateDer: scene.authority.certificateDer,
    })
    expectProblem(theirs.twice, 'certificate', /not the one that the practice recorded/)
  })

  it('refuses a colleague who signs in place of the recorded person', async () => {
    const request = requestFor(scene, 'reviewer', { signer: scene.author })
    expectProblem(
      await signWithoutChecks(once, request),
      'certificate',
      /Signature "reviewer": The certificate is not the one/,
    )
  })

  it('refuses a certificate that was not valid at the stated time', async () => {
    const expired = valueOf(
      await issueSigningCertificate({
        authority: scene.authority,
        practiceName: 'Tarn Hollow EMC',
        personName: 'Bo Müller, Dr.',
        email: 'bo@tarnhollow.example',
        now: NOW - 3_600_000,
        notAfter: NOW - 1000,
      }),
    )
    const pdf = await signWithoutChecks(once, requestFor(scene, 'reviewer', { signer: expired }))
    const { expected } = expectationOf(scene)
    const problems = problemsOf(pdf, {
      ...expectationOf(scene),
      expected: expected.map((entry) =>
        entry.field === 'reviewer' ? { ...entry, fingerprint: expired.fingerprint } : entry,
      ),
    })
    expect(problems.map(({ code }) => code)).toEqual(['validity'])
  })

  it('refuses a block that stands in another place or over another signature', async () => {
    const author = requestFor(scene, 'author')
    const moved = requestFor(scene, 'reviewer', { block: { ...author.block, page: 1 } })
    const pdf = await signWithoutChecks(once, moved)
    expectProblem(pdf, 'field', /another place/)
    const unplaced = expectationOf(scene).expected.map(({ field, fingerprint }) => ({ field, fingerprint }))
    expectProblem(pdf, 'field', /another place/, { ...expectationOf(scene), expected: unplaced })
  })

  it('refuses a second byte range in one signature', () => {
    const text = latin1(twice)
    const at = text.lastIndexOf('/SubFilter /ETSI.CAdES.detached')
    const changed = `${text.slice(0, at)}${'/ByteRange [0 1 2 3]'.padEnd(31)}${text.slice(at + 31)}`
    expect(changed).toHaveLength(text.length)
    expectProblem(fromLatin1(changed), 'unreadable', /the entry \/ByteRange is there twice/)
  })

  it.each([
    ['not from 0', (numbers: number[]) => [1, ...numbers.slice(1)]],
    ['leaving out more than the container', ([a, b = 0, c, d]: number[]) => [a, b - 10, c, d]],
    ['past the end of the file', ([a, b, c, d = 0]: number[]) => [a, b, c, d + 1]],
    ['of three numbers', (numbers: number[]) => numbers.slice(0, 3)],
  ])('refuses a byte range %s', (_, change) => {
    const changed = latin1(twice).replace(
      /\/ByteRange \[([\d ]+?) *\](?![\s\S]*\/ByteRange)/,
      (whole, numbers: string) => {
        const range = `/ByteRange [${change(numbers.split(' ').map(Number)).join(' ')}`
        return `${range.padEnd(whole.length - 1)}]`
      },
    )
    expect(changed).not.toBe(latin1(twice))
    expectProblem(fromLatin1(changed), 'byte_range', /does not cover the file around its own place/)
  })

  it('refuses files that are no PDF or too large to check', () => {
    expectProblem(Buffer.from('MZ'), 'not_a_pdf', /not a PDF/)
    expectProblem(new Uint8Array(0), 'not_a_pdf', /not a PDF/)
    expectProblem(twice, 'too_large', /larger than/, { ...expectationOf(scene), maximumBytes: 1000 })
  })

  it('refuses a PDF of another writer, with cross-reference streams', async () => {
    const document = await PDFDocument.create()
    document.addPage()
    expectProblem(await document.save(), 'unreadable', /not written by the portal/)
  })
})
