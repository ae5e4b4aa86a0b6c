import 'server-only'

import { findUsableCertificate, type CertificateRow } from '@/db/repositories/certificate.repo'
import { insertSignature, moveReport, type ReportRow } from '@/db/repositories/report.repo'
import { withTx } from '@/db/tx'
import type { Actor } from '@/lib/authz/actor'
import { err, ok, type Result } from '@/lib/core/result'
import { openSealedKey } from '@/lib/signature/sealed-key'
import { signPdf } from '@/lib/signature/sign-pdf'

import type { Deps } from '../deps'
import { verifyPassword } from '../identity/sign-in.service'
import { operation } from '../operation'
import { parseAreas } from './frozen-document'
import { authorityCertificate, derOf } from './practice-authority'
import { mailRelease } from './release-mail'
import { reportFor } from './report-resource'
import { reportSteps } from './report-steps'
import {
  noCertificate,
  notTheAuthor,
  notTheReviewer,
  signingFailed,
  stepNotOpen,
  wrongPassphrase,
  type ReportError,
} from './reports.errors'
import { signReportSchema } from './reports.schema'

type Role = 'author' | 'reviewer'

const words: Record<Role, { reason: string; line: string }> = {
  author: { reason: 'Issued as author of this report', line: 'Signed as author' },
  reviewer: { reason: 'Approved as reviewer of this report', line: 'Signed as reviewer' },
}

/**
 * Puts the author's and then the reviewer's signature on the approved file. Password and signing passphrase are asked
 * again. With the second signature the report is released and the client is mailed.
 */
export const signReport = operation('reports.sign', signReportSchema, async (deps, actor, input) => {
  const report = await reportFor(deps.db, actor, 'report.sign', input.reportId)
  if (!report.ok) return report
  const { row, engagement } = report.value
  const role = roleOf(row, actor)
  if (!role.ok) return role
  const person = await verifyPassword(deps, actor.email, input.password)
  if (!person.ok) return person
  const now = Math.floor(deps.clock.now() / 1000) * 1000
  const certificate = await findUsableCertificate(deps.db, actor.personId, now + 999)
  if (!certificate) return err(noCertificate)
  const signed = await addSignature(deps, {
    row,
    role: role.value,
    actor,
    certificate,
    passphrase: input.passphrase,
    now,
  })
  if (!signed.ok) return signed
  const fileId = deps.ids.newId()
  const stored = await deps.files.writeBytes(fileId, signed.value)
  const isMoved = await withTx(deps.db, async (tx) => {
    const isLast = role.value === 'reviewer'
    const from = isLast ? reportSteps.signAsReviewer : reportSteps.signAsAuthor
    const moved = await moveReport(tx, row.id, from, {
      status: isLast ? 'released' : 'author_signed',
      file_id: fileId,
      file_sha256: stored.sha256,
      released_at: isLast ? now : null,
    })
    if (!moved) return false
    await insertSignature(tx, {
      report_id: row.id,
      role: role.value,
      person_id: actor.personId,
      certificate_fingerprint: certificate.fingerprint,
      signed_at: now,
    })
    if (isLast) await mailRelease(tx, deps, row, engagement)
    return true
  })
  if (isMoved) return ok({ reportId: row.id, role: role.value })
  await deps.files.remove(fileId)
  return err(stepNotOpen('signed'))
})

function roleOf(row: ReportRow, actor: Actor): Result<Role, ReportError> {
  if (row.status === 'approved') return row.author_id === actor.personId ? ok('author') : err(notTheAuthor)
  if (row.status === 'author_signed') {
    return row.reviewer_id === actor.personId ? ok('reviewer') : err(notTheReviewer)
  }
  return err(stepNotOpen('signed'))
}

type Signing = {
  readonly row: ReportRow
  readonly role: Role
  readonly actor: Actor
  readonly certificate: CertificateRow
  readonly passphrase: string
  readonly now: number
}

async function addSignature(deps: Deps, signing: Signing): Promise<Result<Uint8Array, ReportError>> {
  const { row, role, actor, certificate, passphrase, now } = signing
  const key = await openSealedKey({
    sealedKey: JSON.parse(certificate.sealed_key),
    passphrase,
    certificateFingerprint: certificate.fingerprint,
  })
  if (!key.ok) return err(wrongPassphrase)
  const authority = await authorityCertificate(deps)
  if (!authority || !row.file_id)
    throw new Error('An approved report has a file, and its signer an authority')
  const area = parseAreas(row.signature_areas)[role]
  const time = new Date(now).toISOString().replace('T', ' ').slice(0, 19)
  const signed = await signPdf(await deps.files.read(row.file_id), {
    field: role,
    reason: words[role].reason,
    signedAt: now,
    block: {
      ...area,
      lines: [
        words[role].line,
        actor.name,
        `${time} UTC`,
        `Certificate ${certificate.fingerprint.slice(0, 16)}…`,
      ],
    },
    font: await deps.pdf.signatureFont(),
    signer: { certificateDer: derOf(certificate.certificate_pem), privateKeyPkcs8: key.value },
    authorityCertificateDer: authority.der,
  })
  return signed.ok ? signed : err(signingFailed(signed.error.message))
}
