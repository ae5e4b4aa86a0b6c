import { type CertificateFacts, isIssuedBy } from '../certificates/certificate-facts'
import { SIGNING_KEY_USAGES } from '../certificates/signing-key-usages'
import type { ContainerOutcome } from './check-container'
import type { SignatureEntry } from './signature-entry'
import { check, type ExpectedSignature, type SignatureCheck } from './verdict'

/** The certificate is the recorded one, the pinned authority of the practice issued it, and it was valid at signing. */
export function checkCertificate(
  entry: SignatureEntry,
  { signer, authority }: NonNullable<ContainerOutcome['certificates']>,
  pinnedAuthority: CertificateFacts | null,
  expected: ExpectedSignature | undefined,
): SignatureCheck[] {
  return [
    check(
      'certificate',
      signer.fingerprint === expected?.fingerprint && signer.commonName === entry.statedName,
      `The certificate is the one that the practice recorded for ${signer.commonName}.`,
      'The certificate is not the one that the practice recorded for this signature.',
    ),
    check(
      'issuer',
      pinnedAuthority !== null &&
        authority.fingerprint === pinnedAuthority.fingerprint &&
        !signer.isAuthority &&
        isForSigning(signer) &&
        isIssuedBy(signer.der, pinnedAuthority.der),
      "The practice's own authority issued the certificate.",
      "The certificate was not issued by the practice's own authority for signing documents.",
    ),
    check(
      'validity',
      isWithin(entry.signedAt, signer) && isWithin(entry.signedAt, authority),
      'The certificate was valid when the signature was made.',
      'The certificate was not valid at the time that the signature states, or it states none.',
    ),
  ]
}

const isWithin = (instant: number | null, { notBefore, notAfter }: CertificateFacts): boolean =>
  instant !== null && instant >= notBefore && instant <= notAfter

const isForSigning = ({ extendedKeyUsages }: CertificateFacts): boolean =>
  extendedKeyUsages.length === 0 || SIGNING_KEY_USAGES.some((usage) => extendedKeyUsages.includes(usage))
