import 'server-only'
import { createHash } from 'node:crypto'

import {
  findReportByCode,
  findReportByHash,
  findReportBySignature,
  listSignatures,
  type ReportRow,
} from '@/db/repositories/report.repo'
import { err, ok, type Result } from '@/lib/core/result'
import type { SignatureVerdict } from '@/lib/signature/verifying/verdict'
import { verifyPdf } from '@/lib/signature/verify-pdf'

import type { Deps } from '../deps'
import { countAgainst, isThrottled } from '../identity/throttle'
import { throttled, type IdentityError } from '../identity/identity.errors'
import { openOperation } from '../operation'
import { normaliseCheckCode } from './check-code'
import { parseAreas } from './frozen-document'
import { authorityCertificate } from './practice-authority'
import { isOpen } from './report-steps'
import { noSuchCode, type ReportError } from './reports.errors'
import { checkCodeSchema, checkFileSchema } from './reports.schema'

export const largestCheckedFile = 32 * 1024 * 1024

type Identity = {
  readonly number: string
  readonly revision: number
  readonly standing: 'current' | 'withdrawn'
  readonly releasedAt: number
}

export type CheckedFile = {
  readonly outcome: 'valid' | 'invalid' | 'unknown'
  readonly sha256: string
  readonly authorityFingerprint: string | null
  /** Known only when the file carries a signature that the practice recorded. */
  readonly report: Identity | null
  readonly signatures: readonly {
    readonly field: string
    readonly signerName: string | null
    readonly signedAt: number | null
    readonly reason: string | null
    readonly passed: boolean
  }[]
  readonly problems: readonly string[]
}

const checksPerWindow = (address: string) => [{ name: `check:${address}`, limit: 60 }]

/**
 * Checks a file that somebody holds against the signatures that the practice recorded. The bytes are looked at in
 * memory and kept nowhere. Valid means: both signatures hold, they cover the whole file, and it is byte for byte the
 * issued one.
 */
export const checkFile = openOperation(
  'reports.checkFile',
  checkFileSchema,
  async (deps, { bytes }): Promise<Result<CheckedFile, IdentityError>> => {
    const buckets = checksPerWindow(deps.request.address)
    if (await isThrottled(deps.db, buckets, deps.clock.now())) return err(throttled)
    await countAgainst(deps.db, buckets, deps.clock.now())
    const sha256 = createHash('sha256').update(bytes).digest('hex')
    const authority = await authorityCertificate(deps)
    const base = { sha256, authorityFingerprint: authority?.fingerprint ?? null }
    if (!authority) {
      const problems = ['This practice has not signed any report yet.']
      return ok({ ...base, outcome: 'unknown', report: null, signatures: [], problems })
    }
    const first = verify(bytes, authority.der, [])
    const report = (await findReportByHash(deps.db, sha256)) ?? (await recordedReport(deps, first))
    if (!report || !isOpen('read', report.status)) {
      const problems = ['The file carries no signature that this practice recorded for a released report.']
      return ok({ ...base, outcome: 'unknown', report: null, signatures: [], problems })
    }
    const verdict = verify(bytes, authority.der, await expectedSignatures(deps, report))
    const isIssued = report.file_sha256 === sha256
    const problems = verdict.problems.map((problem) => problem.sentence)
    if (!isIssued) problems.push('The file is not byte for byte the one that was issued.')
    return ok({
      ...base,
      outcome: verdict.valid && isIssued ? 'valid' : 'invalid',
      report: identityOf(report),
      signatures: verdict.signatures.map((signature) => ({
        field: signature.field,
        signerName: signature.signerName,
        signedAt: signature.signedAt,
        reason: signature.reason,
        passed: signature.checks.every((check) => check.passed),
      })),
      problems,
    })
  },
)

/** What a code on the last page of a report stands for, with the hash of the issued file to compare. */
export const checkCode = openOperation(
  'reports.checkCode',
  checkCodeSchema,
  async (
    deps,
    { code },
  ): Promise<Result<Identity & { readonly sha256: string }, ReportError | IdentityError>> => {
    const buckets = checksPerWindow(deps.request.address)
    if (await isThrottled(deps.db, buckets, deps.clock.now())) return err(throttled)
    await countAgainst(deps.db, buckets, deps.clock.now())
    const report = await findReportByCode(deps.db, normaliseCheckCode(code))
    if (!report || !isOpen('read', report.status) || !report.file_sha256) return err(noSuchCode)
    return ok({ ...identityOf(report), sha256: report.file_sha256 })
  },
)

function verify(
  bytes: Uint8Array,
  authorityCertificateDer: Uint8Array,
  expected: Parameters<typeof verifyPdf>[1]['expected'],
): SignatureVerdict {
  return verifyPdf(bytes, { authorityCertificateDer, expected, maximumBytes: largestCheckedFile })
}

/** The report whose recorded signature the file carries, whole or damaged. */
async function recordedReport(deps: Deps, verdict: SignatureVerdict): Promise<ReportRow | undefined> {
  for (const { fingerprint, signedAt } of verdict.signatures) {
    if (fingerprint === null || signedAt === null) continue
    const report = await findReportBySignature(deps.db, fingerprint, signedAt)
    if (report) return report
  }
  return undefined
}

async function expectedSignatures(deps: Deps, report: ReportRow) {
  const areas = parseAreas(report.signature_areas)
  const signatures = await listSignatures(deps.db, report.id)
  return signatures.map((signature) => ({
    field: signature.role,
    fingerprint: signature.certificate_fingerprint,
    block: areas[signature.role],
  }))
}

const identityOf = (report: ReportRow): Identity => ({
  number: report.number,
  revision: report.revision,
  standing: report.status === 'withdrawn' ? 'withdrawn' : 'current',
  releasedAt: report.released_at ?? 0,
})
