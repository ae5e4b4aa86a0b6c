import 'reflect-metadata'

import { webcrypto } from 'node:crypto'

import {
  AuthorityKeyIdentifierExtension,
  BasicConstraintsExtension,
  ExtendedKeyUsageExtension,
  KeyUsageFlags,
  KeyUsagesExtension,
  SubjectAlternativeNameExtension,
  SubjectKeyIdentifierExtension,
  X509Certificate,
  X509CertificateGenerator,
} from '@peculiar/x509'

import { err, ok, type Result } from '@/lib/core/result'

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
import { SIGNING_KEY_USAGES } from './certificates/signing-key-usages'

export type SigningCertificateError =
  CertificateNameError | { readonly code: 'email_unusable' | 'authority_not_valid'; readonly message: string }

type Authority = Pick<IssuedCertificate, 'certificateDer' | 'privateKeyPkcs8'>

/**
 * Issues a person's signing certificate with a new P-256 key: subject name, e-mail address, random serial number, use
 * limited to signatures on documents. It ends with the authority at the latest.
 * `now` and `notAfter` are UTC milliseconds, kept to whole seconds.
 * Errors: `name_unusable`, `email_unusable`, `authority_not_valid`. Source: RFC 5280, 4.1 and 4.2.
 */
export async function issueSigningCertificate(input: {
  readonly authority: Authority
  readonly practiceName: string
  readonly personName: string
  readonly email: string
  readonly now: number
  readonly notAfter: number
}): Promise<Result<IssuedCertificate, SigningCertificateError>> {
  const subject = certificateSubject(input.personName, input.practiceName)
  if (!subject.ok) return subject
  if (!/^[\x21-\x7e]+@[\x21-\x7e]+$/.test(input.email)) {
    return err({
      code: 'email_unusable',
      message: `The address "${input.email}" cannot stand in a certificate; use one in plain ASCII letters.`,
    })
  }
  const authority = new X509Certificate(Uint8Array.from(input.authority.certificateDer))
  if (input.now < authority.notBefore.getTime() || input.now >= authority.notAfter.getTime()) {
    return err({
      code: 'authority_not_valid',
      message:
        "The practice's certificate authority is not valid today; an administrator must create a new one first.",
    })
  }
  const keys = await webcrypto.subtle.generateKey(SIGNATURE_ALGORITHM, true, ['sign', 'verify'])
  const certificate = await X509CertificateGenerator.create({
    serialNumber: randomSerialNumber(),
    subject: subject.value,
    issuer: authority.subjectName,
    notBefore: new Date(input.now),
    notAfter: new Date(Math.min(input.notAfter, authority.notAfter.getTime())),
    signingAlgorithm: SIGNATURE_ALGORITHM,
    publicKey: keys.publicKey,
    signingKey: await importAuthorityKey(input.authority.privateKeyPkcs8),
    extensions: [
      new BasicConstraintsExtension(false, undefined, true),
      new KeyUsagesExtension(KeyUsageFlags.digitalSignature | KeyUsageFlags.nonRepudiation, true),
      new ExtendedKeyUsageExtension([...SIGNING_KEY_USAGES]),
      new SubjectAlternativeNameExtension([{ type: 'email', value: input.email }]),
      await SubjectKeyIdentifierExtension.create(keys.publicKey),
      await AuthorityKeyIdentifierExtension.create(authority.publicKey),
    ],
  })
  return ok(await toIssuedCertificate(certificate, keys.privateKey))
}

const importAuthorityKey = (privateKeyPkcs8: Uint8Array): Promise<webcrypto.CryptoKey> =>
  webcrypto.subtle.importKey('pkcs8', Uint8Array.from(privateKeyPkcs8), SIGNATURE_ALGORITHM, false, ['sign'])
