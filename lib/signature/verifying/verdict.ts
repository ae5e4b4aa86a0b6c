import type { Rectangle } from '../pdf/field-place'
import type { PdfFileError } from '../pdf/read-pdf-file'

/** One signature that the report must carry, as the portal recorded it when it was made. */
export type ExpectedSignature = {
  readonly field: string
  /** SHA-256 of the recorded signing certificate, lower-case hexadecimal. */
  readonly fingerprint: string
  /** Where the block must stand; left out, only its size is bounded. */
  readonly block?: { readonly page: number; readonly rectangle: Rectangle }
}

/** The rules, in the order of the checks; a signature that has not passed each of them is not valid. */
export const CHECK_NAMES = [
  'field',
  'byte_range',
  'coverage',
  'changes',
  'container',
  'document_digest',
  'signature_value',
  'certificate',
  'issuer',
  'validity',
] as const

export type CheckName = (typeof CHECK_NAMES)[number]

/** One rule that was checked on one signature, with a sentence that fits its outcome. */
export type SignatureCheck = {
  readonly name: CheckName
  readonly passed: boolean
  readonly sentence: string
}

export type CheckedSignature = {
  readonly field: string
  /** From the certificate; null where that cannot be read. */
  readonly signerName: string | null
  readonly fingerprint: string | null
  /** UTC milliseconds; null where the signature states no readable time. */
  readonly signedAt: number | null
  readonly reason: string | null
  /** Counted from 0. */
  readonly page: number | null
  readonly coversWholeFileAtItsRevision: boolean
  /** One for each name; after a container that cannot be read, the rules that need it are left out. */
  readonly checks: readonly SignatureCheck[]
}

export type ProblemCode =
  | PdfFileError['code']
  | CheckName
  | 'form_unreadable'
  | 'not_signed'
  | 'unexpected_field'
  | 'signature_missing'
  | 'changed_after_signing'

export type Problem = {
  readonly code: ProblemCode
  readonly field: string | null
  readonly sentence: string
}

/** The outcome for the file; valid means that every check passed and nothing else is wrong. Signatures stand oldest first. */
export type SignatureVerdict = {
  readonly valid: boolean
  readonly signatures: readonly CheckedSignature[]
  readonly problems: readonly Problem[]
}

export const check = (
  name: CheckName,
  passed: boolean,
  whenPassed: string,
  whenFailed: string,
): SignatureCheck => ({ name, passed, sentence: passed ? whenPassed : whenFailed })
