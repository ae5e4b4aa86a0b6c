import { readFileSync } from 'node:fs'

import { PDFDocument } from '@cantoo/pdf-lib'
import * as fontkit from 'fontkit'

import type { Result } from '@/lib/core/result'
import type { IssuedCertificate } from '@/lib/signature/certificates/issued-certificate'
import { createPracticeAuthority } from '@/lib/signature/practice-authority'
import { signPdf } from '@/lib/signature/sign-pdf'
import { addSignatureField } from '@/lib/signature/signing/add-signature-field'
import { fillSignature } from '@/lib/signature/signing/fill-signature'
import type { SignatureRequest } from '@/lib/signature/signing/signature-request'
import { issueSigningCertificate } from '@/lib/signature/signing-certificate'
import type { VerificationInput } from '@/lib/signature/verify-pdf'

const DAY = 24 * 60 * 60 * 1000

export const NOW = Date.UTC(2026, 11, 1, 12, 0, 0)

export const FONT = Uint8Array.from(readFileSync('pdf/fonts/SourceSans3-Regular.ttf'))

export function valueOf<T, E>(result: Result<T, E>): T {
  if (!result.ok) throw new Error(JSON.stringify(result.error))
  return result.value
}

/** A practice with an author and a reviewer, both with certificates. */
export type SigningScene = {
  readonly authority: IssuedCertificate
  readonly author: IssuedCertificate
  readonly reviewer: IssuedCertificate
}

export async function createScene(practiceName = 'Tarn Hollow EMC'): Promise<SigningScene> {
  const authority = valueOf(
    await createPracticeAuthority({ practiceName, now: NOW - DAY, notAfter: NOW + 3650 * DAY }),
  )
  const issue = async (personName: string, email: string) =>
    valueOf(
      await issueSigningCertificate({
        authority,
        practiceName,
        personName,
        email,
        now: NOW - DAY,
        notAfter: NOW + 365 * DAY,
      }),
    )
  return {
    authority,
    author: await issue('Ada Example', 'ada@tarnhollow.example'),
    reviewer: await issue('Bo Müller, Dr.', 'bo@tarnhollow.example'),
  }
}

/** A report of two pages, written with classic cross-reference tables as the portal's renderer does. */
export async function createReport(): Promise<Uint8Array> {
  const document = await PDFDocument.create({ updateMetadata: false })
  document.registerFontkit(fontkit)
  const font = await document.embedFont(FONT, { subset: true, customName: 'REPORT+SourceSans3' })
  for (const text of ['Ring at 180 MHz: Z₀ = 14.2 Ω ± 5 %', 'Signatures']) {
    document.addPage([595, 842]).drawText(text, { x: 60, y: 760, size: 14, font })
  }
  return document.save({ useObjectStreams: false })
}

export function requestFor(
  scene: SigningScene,
  role: 'author' | 'reviewer',
  changes: Partial<SignatureRequest> = {},
): SignatureRequest {
  const name = role === 'author' ? 'Ada Example' : 'Bo Müller, Dr.'
  return {
    field: role,
    reason: `Signed as ${role} of this report`,
    signedAt: NOW + (role === 'author' ? 0 : 3_600_000),
    block: {
      page: 1,
      rectangle: { x: 60, y: role === 'author' ? 640 : 560, width: 240, height: 60 },
      lines: [
        `Signed as ${role} by ${name}`,
        `Signed as ${role} of this report`,
        '1 December 2026, 12:00 UTC',
      ],
    },
    font: FONT,
    signer: scene[role],
    authorityCertificateDer: scene.authority.certificateDer,
    ...changes,
  }
}

export function expectationOf(
  scene: SigningScene,
  roles: readonly ('author' | 'reviewer')[] = ['author', 'reviewer'],
): VerificationInput {
  return {
    authorityCertificateDer: scene.authority.certificateDer,
    expected: roles.map((role) => {
      const { page, rectangle } = requestFor(scene, role).block
      return { field: role, fingerprint: scene[role].fingerprint, block: { page, rectangle } }
    }),
  }
}

export async function signByBoth(scene: SigningScene): Promise<{ once: Uint8Array; twice: Uint8Array }> {
  const once = valueOf(await signPdf(await createReport(), requestFor(scene, 'author')))
  return { once, twice: valueOf(await signPdf(once, requestFor(scene, 'reviewer'))) }
}

/** Saves a change to the file as an incremental update of its own. */
export async function updateWith(
  pdf: Uint8Array,
  change: (document: PDFDocument) => void | Promise<void>,
): Promise<Uint8Array> {
  const document = await PDFDocument.load(pdf, { forIncrementalUpdate: true, updateMetadata: false })
  document.registerFontkit(fontkit)
  await change(document)
  return document.save({ useObjectStreams: false })
}

/** Signs without the checks that `signPdf` makes, and with a change in the same save: what a hostile signer could do. */
export async function signWithoutChecks(
  pdf: Uint8Array,
  request: SignatureRequest,
  change: (document: PDFDocument) => void | Promise<void> = () => undefined,
  name = 'Bo Müller, Dr.',
): Promise<Uint8Array> {
  const unsigned = await updateWith(pdf, async (document) => {
    await change(document)
    valueOf(await addSignatureField(document, request, name))
  })
  return fillSignature(unsigned, request)
}

export async function drawExtraText(document: PDFDocument): Promise<void> {
  const font = await document.embedFont(FONT, { subset: true, customName: 'EXTRAS+SourceSans3' })
  document.getPage(0).drawText('and everything is fine', { x: 60, y: 700, size: 14, font })
}
