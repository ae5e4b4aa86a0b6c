import { webcrypto } from 'node:crypto'

import type { X509Certificate } from '@peculiar/x509'

import { certificateFingerprint } from './fingerprint'

/** A new certificate with its private key. The key is in clear: seal it at once, and keep it nowhere else. */
export type IssuedCertificate = {
  readonly certificateDer: Uint8Array
  readonly certificatePem: string
  readonly privateKeyPkcs8: Uint8Array
  readonly fingerprint: string
  /** In hexadecimal; record it, a later revocation list names certificates by it. */
  readonly serialNumber: string
  readonly notBefore: number
  readonly notAfter: number
}

/** P-256 with SHA-256 (FIPS 186-5, SP 800-186): the one algorithm of the practice. */
export const SIGNATURE_ALGORITHM = { name: 'ECDSA', namedCurve: 'P-256', hash: 'SHA-256' } as const

export async function toIssuedCertificate(
  certificate: X509Certificate,
  privateKey: webcrypto.CryptoKey,
): Promise<IssuedCertificate> {
  const certificateDer = new Uint8Array(certificate.rawData)
  return {
    certificateDer,
    certificatePem: certificate.toString('pem'),
    privateKeyPkcs8: new Uint8Array(await webcrypto.subtle.exportKey('pkcs8', privateKey)),
    fingerprint: certificateFingerprint(certificateDer),
    serialNumber: certificate.serialNumber.toLowerCase(),
    notBefore: certificate.notBefore.getTime(),
    notAfter: certificate.notAfter.getTime(),
  }
}
