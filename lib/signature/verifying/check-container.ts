import { createHash, verify } from 'node:crypto'

import { err, type Result } from '@/lib/core/result'

import { type CertificateFacts, readCertificate } from '../certificates/certificate-facts'
import type { ContainerParts } from '../container/assemble-container'
import { readContainer } from '../container/read-container'
import { signedAttributes } from '../container/signed-attributes'
import type { PdfFile } from '../pdf/pdf-file'
import type { SignatureEntry } from './signature-entry'
import { check, type SignatureCheck } from './verdict'

export type ContainerOutcome = {
  readonly checks: readonly SignatureCheck[]
  /** The certificates that the container carries; null where it cannot be read with both of them. */
  readonly certificates: { readonly signer: CertificateFacts; readonly authority: CertificateFacts } | null
}

/** The container is well formed, its digest is that of the signed bytes, and the signer's key made the signature. */
export function checkContainer(file: PdfFile, entry: SignatureEntry): ContainerOutcome {
  const parts = readParts(file, entry)
  if (!parts.ok) return unreadable(parts.error)
  const { signerCertificateDer, authorityCertificateDer, documentDigest, signature } = parts.value
  const signer = readCertificate(signerCertificateDer)
  const authority = readCertificate(authorityCertificateDer)
  if (!signer || !authority) return unreadable('A certificate in the signature cannot be read.')
  const { der } = signedAttributes(documentDigest, signerCertificateDer)
  return {
    certificates: { signer, authority },
    checks: [
      check('container', true, 'The signature holds exactly the parts that it should.', ''),
      check(
        'document_digest',
        Buffer.compare(digestOf(file, entry), documentDigest) === 0,
        'The document is byte for byte the one that was signed.',
        'The document was changed after it was signed: its digest is another one.',
      ),
      check(
        'signature_value',
        verifyP256(der, signer, signature),
        "The signature was made with the key of the signer's certificate.",
        "The signature was not made with the key of the signer's certificate.",
      ),
    ],
  }
}

const unreadable = (sentence: string): ContainerOutcome => ({
  checks: [check('container', false, '', sentence)],
  certificates: null,
})

/** The container's bytes without the padding, which must be zeros in the notation that the practice writes. */
function readParts(file: PdfFile, entry: SignatureEntry): Result<ContainerParts, string> {
  const { container } = entry
  if (!container) return err('The signature is not written as a hexadecimal string.')
  const length = derLength(container.bytes)
  if (length === null || container.bytes.subarray(length).some((byte) => byte !== 0)) {
    return err('The space behind the signature holds something else than zeros.')
  }
  const written = Buffer.from(file.bytes.subarray(container.start + 1, container.end - 1)).toString('latin1')
  if (written !== Buffer.from(container.bytes).toString('hex')) {
    return err('The signature is written in another notation than it was signed in.')
  }
  const parts = readContainer(container.bytes.subarray(0, length))
  return parts.ok ? parts : err(parts.error.message)
}

/** The length that a DER element with a two-byte length states, header included (X.690, 8.1.3.5). */
function derLength(bytes: Uint8Array): number | null {
  const [tag, form, high, low] = bytes
  if (tag !== 0x30 || form !== 0x82 || high === undefined || low === undefined) return null
  const length = 4 + high * 256 + low
  return length <= bytes.length ? length : null
}

function digestOf(file: PdfFile, { range }: SignatureEntry): Buffer {
  const hash = createHash('sha256')
  if (range)
    hash.update(file.bytes.subarray(0, range.gapStart)).update(file.bytes.subarray(range.gapEnd, range.end))
  return hash.digest()
}

function verifyP256(signed: Uint8Array, { publicKey }: CertificateFacts, signature: Uint8Array): boolean {
  if (publicKey.asymmetricKeyType !== 'ec' || publicKey.asymmetricKeyDetails?.namedCurve !== 'prime256v1')
    return false
  return verify('sha256', signed, { key: publicKey, dsaEncoding: 'der' }, signature)
}
