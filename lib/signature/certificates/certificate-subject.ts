import { randomBytes } from 'node:crypto'

import type { JsonName } from '@peculiar/x509'

import { err, ok, type Result } from '@/lib/core/result'

export type CertificateNameError = { readonly code: 'name_unusable'; readonly message: string }

/** RFC 5280, appendix A.1, ub-common-name. */
const LONGEST_COMMON_NAME = 64

/** The subject of a certificate, given as parts and not as text, so that commas in a name stay in the name. */
export function certificateSubject(
  commonName: string,
  organisation: string,
): Result<JsonName, CertificateNameError> {
  for (const name of [commonName, organisation]) {
    const length = [...name.trim()].length
    if (length < 1 || length > LONGEST_COMMON_NAME || /\p{Cc}/u.test(name)) {
      return err({
        code: 'name_unusable',
        message: `The name "${name}" cannot stand in a certificate: it needs 1 to ${LONGEST_COMMON_NAME} characters without control characters.`,
      })
    }
  }
  return ok([{ CN: [commonName.trim()] }, { O: [organisation.trim()] }])
}

/** A positive serial number of 126 random bits in hexadecimal (RFC 5280, 4.1.2.2: at most 20 octets, unique). */
export function randomSerialNumber(): string {
  const bytes = randomBytes(16)
  bytes[0] = ((bytes[0] ?? 0) & 0x3f) | 0x40
  return bytes.toString('hex')
}
