import { OctetString } from 'asn1js'
import {
  AlgorithmIdentifier,
  Certificate,
  ContentInfo,
  EncapsulatedContentInfo,
  IssuerAndSerialNumber,
  SignedAndUnsignedAttributes,
  SignedData,
  SignerInfo,
} from 'pkijs'

import { arrayBuffer } from './array-buffer'
import { DATA, ECDSA_WITH_SHA_256, SHA_256, SIGNED_DATA } from './object-identifiers'
import { signedAttributes } from './signed-attributes'

/** Everything that distinguishes one signature container of the practice from another. */
export type ContainerParts = {
  readonly signerCertificateDer: Uint8Array
  readonly authorityCertificateDer: Uint8Array
  /** SHA-256 of the signed byte range. */
  readonly documentDigest: Uint8Array
  /** ECDSA over the signed attributes, as a DER sequence of r and s. */
  readonly signature: Uint8Array
}

/**
 * Assembles the detached CMS container (RFC 5652, 5; ETSI EN 319 122-1 baseline) from its parts. One set of parts has
 * exactly one encoding, so a reader can rebuild a container and compare it byte by byte.
 */
export function assembleContainer(parts: ContainerParts): Uint8Array {
  const signer = Certificate.fromBER(arrayBuffer(parts.signerCertificateDer))
  const authority = Certificate.fromBER(arrayBuffer(parts.authorityCertificateDer))
  const { attributes } = signedAttributes(parts.documentDigest, parts.signerCertificateDer)
  const inDerOrder = Buffer.compare(parts.signerCertificateDer, parts.authorityCertificateDer) < 0
  const signedData = new SignedData({
    version: 1,
    digestAlgorithms: [new AlgorithmIdentifier({ algorithmId: SHA_256 })],
    encapContentInfo: new EncapsulatedContentInfo({ eContentType: DATA }),
    certificates: inDerOrder ? [signer, authority] : [authority, signer],
    signerInfos: [
      new SignerInfo({
        version: 1,
        sid: new IssuerAndSerialNumber({ issuer: signer.issuer, serialNumber: signer.serialNumber }),
        digestAlgorithm: new AlgorithmIdentifier({ algorithmId: SHA_256 }),
        signedAttrs: new SignedAndUnsignedAttributes({ type: 0, attributes: [...attributes] }),
        signatureAlgorithm: new AlgorithmIdentifier({ algorithmId: ECDSA_WITH_SHA_256 }),
        signature: new OctetString({ valueHex: arrayBuffer(parts.signature) }),
      }),
    ],
  })
  const content = new ContentInfo({ contentType: SIGNED_DATA, content: signedData.toSchema() })
  return new Uint8Array(content.toSchema().toBER())
}
