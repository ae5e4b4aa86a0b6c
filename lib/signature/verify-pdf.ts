import { type CertificateFacts, readCertificate } from './certificates/certificate-facts'
import { fieldPlace } from './pdf/field-place'
import { pageObjects } from './pdf/page-list'
import type { PdfFile } from './pdf/pdf-file'
import { DEFAULT_MAXIMUM_BYTES, readPdfFile } from './pdf/read-pdf-file'
import { type FormField, formFields } from './pdf/signature-fields'
import { checkCertificate } from './verifying/check-certificate'
import { checkContainer } from './verifying/check-container'
import { checkField } from './verifying/check-field'
import { checkRevision } from './verifying/check-revision'
import { readSignatureEntry, type SignatureEntry, type SignedField } from './verifying/signature-entry'
import {
  CHECK_NAMES,
  type CheckedSignature,
  type ExpectedSignature,
  type Problem,
  type SignatureVerdict,
} from './verifying/verdict'

/** What the portal knows of the report beforehand; without it a signature proves nothing. */
export type VerificationInput = {
  readonly authorityCertificateDer: Uint8Array
  readonly expected: readonly ExpectedSignature[]
  readonly maximumBytes?: number
}

/** More fields than any report has; further ones are not looked into. */
const MOST_FIELDS = 8

/**
 * Verifies a signed report against the recorded signatures and the pinned authority of the practice.
 *
 * It never throws: a file that is no PDF, damaged or hostile gets a verdict with typed problems in plain sentences.
 * The work is linear in the size of the file, which `maximumBytes` limits (64 MiB by default).
 * Revocation is not looked up. Compare the file's own SHA-256 with the issued one besides.
 * Sources: ISO 32000-1:2008, 12.8; ETSI EN 319 142-1; RFC 5652; RFC 5035; RFC 5280, 6.
 */
export function verifyPdf(bytes: Uint8Array, input: VerificationInput): SignatureVerdict {
  const file = readPdfFile(bytes, input.maximumBytes ?? DEFAULT_MAXIMUM_BYTES)
  if (!file.ok) return verdict([], [{ code: file.error.code, field: null, sentence: file.error.message }])
  const fields = formFields(file.value)
  const pages = pageObjects(file.value)
  if (!fields || !pages || fields.length > MOST_FIELDS) {
    const sentence =
      'The list of pages or signatures in this PDF is damaged or was not written by the portal.'
    return verdict([], [{ code: 'form_unreadable', field: null, sentence }])
  }
  const entries = fields
    .filter(isSigned)
    .map((field) => readSignatureEntry(file.value, field))
    .sort((a, b) => (a.range?.end ?? 0) - (b.range?.end ?? 0))
  const authority = readCertificate(input.authorityCertificateDer)
  const signatures = entries.map((entry, index) =>
    checkSignature(file.value, entry, { previous: entries[index - 1], pages, fields, authority, input }),
  )
  return verdict(signatures, [
    ...fieldProblems(fields, input.expected),
    ...endProblem(file.value, entries),
    ...signatures.flatMap(failedChecks),
  ])
}

const verdict = (
  signatures: readonly CheckedSignature[],
  problems: readonly Problem[],
): SignatureVerdict => ({
  valid: signatures.length > 0 && signatures.every(hasPassedAll) && problems.length === 0,
  signatures,
  problems,
})

/** Stated by the rules, not by the absence of failures: a check that was not made must not count as passed. */
const hasPassedAll = ({ checks }: CheckedSignature): boolean =>
  CHECK_NAMES.every((rule) => checks.some(({ name, passed }) => name === rule && passed))

const isSigned = (field: FormField): field is SignedField => field.signature !== null

type Surroundings = {
  readonly previous: SignatureEntry | undefined
  readonly pages: readonly number[]
  readonly fields: readonly FormField[]
  readonly authority: CertificateFacts | null
  readonly input: VerificationInput
}

function checkSignature(file: PdfFile, entry: SignatureEntry, around: Surroundings): CheckedSignature {
  const { previous, pages, fields, authority, input } = around
  const expected = input.expected.find(({ field }) => field === entry.field.name)
  const { certificates, checks } = checkContainer(file, entry)
  const page = pages.indexOf(fieldPlace(entry.field.dictionary)?.page ?? -1)
  return {
    field: entry.field.name,
    signerName: certificates?.signer.commonName ?? null,
    fingerprint: certificates?.signer.fingerprint ?? null,
    signedAt: entry.signedAt,
    reason: entry.reason,
    page: page < 0 ? null : page,
    coversWholeFileAtItsRevision: entry.revision !== null,
    checks: [
      checkField(file, entry, pages, fields, expected),
      ...checkRevision(file, entry, previous),
      ...checks,
      ...(certificates ? checkCertificate(entry, certificates, authority, expected) : []),
    ],
  }
}

function fieldProblems(fields: readonly FormField[], expected: readonly ExpectedSignature[]): Problem[] {
  const problems: Problem[] = []
  for (const [index, { name, signature }] of fields.entries()) {
    const isRepeated = fields.findIndex((other) => other.name === name) !== index
    if (signature && !isRepeated && expected.some(({ field }) => field === name)) continue
    const sentence = `The PDF holds the field "${name}", which is not one of the report's signatures.`
    problems.push({ code: 'unexpected_field', field: name, sentence })
  }
  if (!fields.some(isSigned)) {
    return [...problems, { code: 'not_signed', field: null, sentence: 'This PDF carries no signature.' }]
  }
  for (const { field } of expected) {
    if (fields.some(({ name }) => name === field)) continue
    problems.push({
      code: 'signature_missing',
      field,
      sentence: `The required signature "${field}" is missing.`,
    })
  }
  return problems
}

/** The newest signature must end with the file. */
function endProblem(file: PdfFile, entries: readonly SignatureEntry[]): Problem[] {
  const last = entries.at(-1)
  if (!last || last.range?.end === file.bytes.length) return []
  const sentence = 'Something was added to the file after the last signature.'
  return [{ code: 'changed_after_signing', field: null, sentence }]
}

const failedChecks = ({ field, checks }: CheckedSignature): Problem[] =>
  checks
    .filter(({ passed }) => !passed)
    .map(({ name, sentence }) => ({ code: name, field, sentence: `Signature "${field}": ${sentence}` }))
