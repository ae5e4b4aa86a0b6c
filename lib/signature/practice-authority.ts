import 'reflect-metadata'

import { webcrypto } from 'node:crypto'

import {
  BasicConstraintsExtension,
  KeyUsageFlags,
  KeyUsagesExtension,
  SubjectKeyIdentifierExtension,
  X509CertificateGenerator,
} from '@peculiar/x509'

import { ok, type Result } from '@/lib/core/result'

import {
  type CertificateNameError,
  certificateSubject,
  randomSerialNumber,
} from './certificates/certificate-subject'
import {
  type IssuedCertificate,
  SIGNATURE_ALGORITHM,
  toIssuedCertificate,
} from './certificates/issued-certificate'

/**
 * Creates the practice's own certificate authority: a P-256 key with a self-signed certificate that may sign
 * certificates and revocation lists, and no further authority below it.
 * `now` and `notAfter` are UTC milliseconds, kept to whole seconds. Errors: `name_unusable`. Source: RFC 5280, 4.1 and 4.2.
 */
export async function createPracticeAuthority(input: {
  readonly practiceName: string
  readonly now: number
  readonly notAfter: number
}): Promise<Result<IssuedCertificate, CertificateNameError>> {
  const subject = certificateSubject(`${input.practiceName} report authority`, input.practiceName)
  if (!subject.ok) return subject
  const keys = await webcrypto.subtle.generateKey(SIGNATURE_ALGORITHM, true, ['sign', 'verify'])
  const certificate = await X509CertificateGenerator.createSelfSigned({
    serialNumber: randomSerialNumber(),
    name: subject.value,
    notBefore: new Date(input.now),
    notAfter: new Date(input.notAfter),
    signingAlgorithm: SIGNATURE_ALGORITHM,
    keys,
    extensions: [
      new BasicConstraintsExtension(true, 0, true),
      new KeyUsagesExtension(KeyUsageFlags.keyCertSign | KeyUsageFlags.cRLSign, true),
      await SubjectKeyIdentifierExtension.create(keys.publicKey),
    ],
  })
  return ok(await toIssuedCertificate(certificate, keys.privateKey))
}
