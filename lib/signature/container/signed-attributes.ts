import { createHash } from 'node:crypto'

import { ObjectIdentifier, OctetString, Sequence, Set as Asn1Set } from 'asn1js'
import { Attribute } from 'pkijs'

import { arrayBuffer } from './array-buffer'
import { CONTENT_TYPE, DATA, MESSAGE_DIGEST, SIGNING_CERTIFICATE_V2 } from './object-identifiers'

export type SignedAttributes = {
  readonly attributes: readonly Attribute[]
  /** The DER of the SET OF Attribute, which is what the key signs (RFC 5652, 5.4). */
  readonly der: Uint8Array
}

/**
 * The attributes that a signature covers: content type, digest of the document and the signer's certificate
 * (signing-certificate-v2 with SHA-256, RFC 5035, 3), in the order that DER demands of a SET OF (X.690, 11.6).
 * There is no signing-time attribute: the time stands in the signature dictionary (ETSI EN 319 142-1, 5.3).
 */
export function signedAttributes(
  documentDigest: Uint8Array,
  signerCertificateDer: Uint8Array,
): SignedAttributes {
  const certificateHash = createHash('sha256').update(signerCertificateDer).digest()
  const certificateId = new Sequence({ value: [new OctetString({ valueHex: arrayBuffer(certificateHash) })] })
  const attributes = [
    new Attribute({ type: CONTENT_TYPE, values: [new ObjectIdentifier({ value: DATA })] }),
    new Attribute({
      type: MESSAGE_DIGEST,
      values: [new OctetString({ valueHex: arrayBuffer(documentDigest) })],
    }),
    new Attribute({
      type: SIGNING_CERTIFICATE_V2,
      values: [new Sequence({ value: [new Sequence({ value: [certificateId] })] })],
    }),
  ].sort((a, b) => Buffer.compare(derOf(a), derOf(b)))
  const set = new Asn1Set({ value: attributes.map((attribute) => attribute.toSchema()) })
  return { attributes, der: new Uint8Array(set.toBER()) }
}

const derOf = (attribute: Attribute): Uint8Array => new Uint8Array(attribute.toSchema().toBER())
