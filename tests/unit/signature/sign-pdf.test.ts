import { beforeAll, describe, expect, it } from 'vitest'

import { signPdf } from '@/lib/signature/sign-pdf'
import { verifyPdf } from '@/lib/signature/verify-pdf'

import {
  createReport,
  createScene,
  expectationOf,
  NOW,
  requestFor,
  signByBoth,
  type SigningScene,
  valueOf,
} from './signing-scene'

describe('signing a report', () => {
  let scene: SigningScene
  beforeAll(async () => {
    scene = await createScene()
  })

  it('BZ3: gives a file that verifies, with who signed, when and why', async () => {
    const { twice } = await signByBoth(scene)
    const verdict = verifyPdf(twice, expectationOf(scene))
    expect(verdict.problems).toEqual([])
    expect(verdict.valid).toBe(true)
    expect(verdict.signatures).toMatchObject([
      {
        field: 'author',
        signerName: 'Ada Example',
        fingerprint: scene.author.fingerprint,
        signedAt: NOW,
        reason: 'Signed as author of this report',
        page: 1,
        coversWholeFileAtItsRevision: true,
      },
      { field: 'reviewer', signerName: 'Bo Müller, Dr.', signedAt: NOW + 3_600_000, page: 1 },
    ])
    expect(verdict.signatures.flatMap(({ checks }) => checks.map(({ sentence }) => sentence))).not.toContain(
      '',
    )
  })

  it('keeps every earlier byte when the second signer signs', async () => {
    const { once, twice } = await signByBoth(scene)
    expect(Buffer.compare(twice.subarray(0, once.length), once)).toBe(0)
  })

  it('BZ3: writes the same bytes for the same inputs, but for the signature value', async () => {
    const report = await createReport()
    const [first, second] = await Promise.all([
      signPdf(report, requestFor(scene, 'author')),
      signPdf(report, requestFor(scene, 'author')),
    ])
    const withoutContainer = (pdf: Uint8Array) =>
      Buffer.from(pdf)
        .toString('latin1')
        .replace(/\/Contents <[0-9a-f]+>/, '')
    expect(withoutContainer(valueOf(first))).toBe(withoutContainer(valueOf(second)))
  })

  it('accepts a name with brackets and syntax in it as plain text', async () => {
    const request = requestFor(scene, 'author', { reason: ') /ByteRange [0 1 2 3] >> endobj (' })
    const signed = valueOf(await signPdf(await createReport(), request))
    const [signature] = verifyPdf(signed, expectationOf(scene)).signatures
    expect(signature?.reason).toBe(') /ByteRange [0 1 2 3] >> endobj (')
    expect(signature?.checks.every(({ passed }) => passed)).toBe(true)
  })

  it.each([
    ['a second signature under one name', 'field_exists', {}],
    ['a page that is not there', 'no_such_page', { page: 7 }],
    [
      'a block outside the page',
      'block_outside_page',
      { rectangle: { x: 500, y: 10, width: 240, height: 60 } },
    ],
    [
      'a block over the whole page',
      'block_outside_page',
      { page: 0, rectangle: { x: 0, y: 0, width: 595, height: 842 } },
    ],
    ['text that does not fit', 'block_too_small', { lines: ['x'.repeat(200)] }],
    ['a character that the font lacks', 'character_missing', { lines: ['署名'] }],
  ] as const)('refuses %s', async (_, code, change) => {
    const { once } = await signByBoth(scene)
    const role = code === 'field_exists' ? 'author' : 'reviewer'
    const request = requestFor(scene, role)
    const refused = await signPdf(once, { ...request, block: { ...request.block, ...change } })
    expect(refused).toMatchObject({ ok: false, error: { code } })
  })

  it('refuses a certificate that is expired, foreign, or not that of the key', async () => {
    const report = await createReport()
    const other = await createScene('Other Practice')
    for (const change of [
      { signedAt: NOW + 400 * 24 * 3_600_000 },
      { signer: other.author },
      { signer: { ...scene.author, privateKeyPkcs8: scene.reviewer.privateKeyPkcs8 } },
    ]) {
      const refused = await signPdf(report, requestFor(scene, 'author', change))
      expect(refused).toMatchObject({ ok: false, error: { code: 'certificate_unusable' } })
    }
  })

  it('refuses bytes that are no PDF', async () => {
    const refused = await signPdf(Buffer.from('hello'), requestFor(scene, 'author'))
    expect(refused).toMatchObject({ ok: false, error: { code: 'not_a_pdf' } })
  })
})
