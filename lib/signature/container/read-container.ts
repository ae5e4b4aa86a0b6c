import { OctetString, Sequence } from 'asn1js'
import { Certificate, ContentInfo, IssuerAndSerialNumber, SignedData, type SignerInfo } from 'pkijs'

import { err, ok, type Result } from '@/lib/core/result'

import { arrayBuffer } from './array-buffer'
import { assembleContainer, type ContainerParts } from './assemble-container'
import {
  ECDSA_WITH_SHA_256,
  MESSAGE_DIGEST,
  SHA_256,
  SIGNED_DATA,
  SIGNING_CERTIFICATE_V2,
} from './object-identifiers'

export type ContainerError = {
  readonly code:
    | 'container_unreadable'
    | 'embedded_content'
    | 'several_signers'
    | 'other_algorithm'
    | 'certificates_missing'
    | 'signing_certificate_missing'
    | 'container_not_canonical'
  readonly message: string
}

const failure = (code: ContainerError['code'], message: string) => err({ code, message })

/**
 * Reads a signature container and takes it only if it is, byte by byte, what `assembleContainer` makes of its parts:
 * detached, one signer, SHA-256 with P-256, signing-certificate-v2, two certificates, nothing else.
 * The library only parses here; nothing is trusted until node:crypto has checked it.
 */
export function readContainer(der: Uint8Array): Result<ContainerParts, ContainerError> {
  try {
    const content = ContentInfo.fromBER(arrayBuffer(der))
    if (content.contentType !== SIGNED_DATA) {
      return failure('container_unreadable', 'The signature does not hold signed data.')
    }
    return readSignedData(new SignedData({ schema: content.content }), der)
  } catch {
    // The parser signals unreadable bytes by throwing errors of many classes.
    return failure('container_unreadable', 'The signature cannot be read; its bytes are damaged.')
  }
}

function readSignedData(signedData: SignedData, der: Uint8Array): Result<ContainerParts, ContainerError> {
  if (signedData.encapContentInfo.eContent !== undefined) {
    return failure(
      'embedded_content',
      'The signature carries content of its own instead of covering this document.',
    )
  }
  const [signer, ...others] = signedData.signerInfos
  if (!signer || others.length > 0) {
    return failure('several_signers', 'The signature must name exactly one signer.')
  }
  if (
    signer.digestAlgorithm.algorithmId !== SHA_256 ||
    signer.signatureAlgorithm.algorithmId !== ECDSA_WITH_SHA_256
  ) {
    return failure('other_algorithm', 'The signature uses another algorithm than SHA-256 with P-256.')
  }
  const certificates = readCertificates(signedData, signer)
  if (!certificates) {
    return failure(
      'certificates_missing',
      "The signature must carry the signer's and the authority's certificate.",
    )
  }
  if (!attributeValue(signer, SIGNING_CERTIFICATE_V2, Sequence)) {
    return failure('signing_certificate_missing', 'The signature does not bind its certificate.')
  }
  const digest = attributeValue(signer, MESSAGE_DIGEST, OctetString)
  if (!digest)
    return failure('container_unreadable', 'The signature does not state the digest of the document.')
  const parts: ContainerParts = {
    ...certificates,
    documentDigest: Uint8Array.from(digest.valueBlock.valueHexView),
    signature: Uint8Array.from(signer.signature.valueBlock.valueHexView),
  }
  if (Buffer.compare(assembleContainer(parts), der) !== 0) {
    return failure(
      'container_not_canonical',
      'The signature holds more than, or something other than, its required parts.',
    )
  }
  return ok(parts)
}

function readCertificates(signedData: SignedData, signer: SignerInfo) {
  const { sid } = signer
  if (!(sid instanceof IssuerAndSerialNumber)) return null
  const certificates = (signedData.certificates ?? []).filter((entry) => entry instanceof Certificate)
  const isSigners = (entry: Certificate) =>
    entry.issuer.isEqual(sid.issuer) && entry.serialNumber.isEqual(sid.serialNumber)
  const own = certificates.find(isSigners)
  const authority = certificates.find((entry) => !isSigners(entry))
  if (!own || !authority || certificates.length !== 2) return null
  return {
    signerCertificateDer: new Uint8Array(own.toSchema().toBER()),
    authorityCertificateDer: new Uint8Array(authority.toSchema().toBER()),
  }
}

/** The single value of a signed attribute, if it is there once and of the right type. */
function attributeValue<T>(signer: SignerInfo, type: string, kind: new () => T): T | null {
  const values: unknown[] = (signer.signedAttrs?.attributes ?? [])
    .filter((attribute) => attribute.type === type)
    .flatMap((attribute) => attribute.values)
  const [value, ...others] = values
  return value instanceof kind && others.length === 0 ? value : null
}
