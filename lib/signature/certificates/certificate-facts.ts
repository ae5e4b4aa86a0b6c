import { type KeyObject, X509Certificate } from 'node:crypto'

import { Certificate } from 'pkijs'

import { arrayBuffer } from '../container/array-buffer'

import { certificateFingerprint } from './fingerprint'

/** What the portal reads from a certificate; instants are UTC milliseconds. */
export type CertificateFacts = {
  readonly der: Uint8Array
  readonly fingerprint: string
  /** In hexadecimal, lower case. */
  readonly serialNumber: string
  readonly commonName: string
  readonly email: string | null
  readonly notBefore: number
  readonly notAfter: number
  readonly isAuthority: boolean
  readonly extendedKeyUsages: readonly string[]
  readonly publicKey: KeyObject
}

const COMMON_NAME = '2.5.4.3'

/** Reads a certificate from DER; null where the bytes are not exactly one readable certificate. */
export function readCertificate(der: Uint8Array): CertificateFacts | null {
  try {
    const checked = new X509Certificate(der)
    if (Buffer.compare(checked.raw, der) !== 0) return null
    const parsed = Certificate.fromBER(arrayBuffer(der))
    const commonName: unknown = parsed.subject.typesAndValues.find(({ type }) => type === COMMON_NAME)?.value
      .valueBlock.value
    return {
      der,
      fingerprint: certificateFingerprint(der),
      serialNumber: checked.serialNumber.toLowerCase(),
      commonName: typeof commonName === 'string' ? commonName : '',
      email: /(?:^|, )email:([^,]+)/.exec(checked.subjectAltName ?? '')?.[1] ?? null,
      notBefore: parsed.notBefore.value.getTime(),
      notAfter: parsed.notAfter.value.getTime(),
      isAuthority: checked.ca,
      // Node's types leave out that a certificate may have no extended key usage.
      extendedKeyUsages: (checked.keyUsage as readonly string[] | undefined) ?? [],
      publicKey: checked.publicKey,
    }
  } catch {
    // Both parsers signal unreadable bytes by throwing errors of many classes.
    return null
  }
}

/** Whether the authority issued the certificate: names match and the authority's key made its signature. */
export function isIssuedBy(certificateDer: Uint8Array, authorityDer: Uint8Array): boolean {
  try {
    const certificate = new X509Certificate(certificateDer)
    const authority = new X509Certificate(authorityDer)
    return authority.ca && certificate.checkIssued(authority) && certificate.verify(authority.publicKey)
  } catch {
    // A key or algorithm that OpenSSL does not know is signalled by throwing.
    return false
  }
}
