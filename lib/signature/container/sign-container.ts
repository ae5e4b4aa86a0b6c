import { createPrivateKey, sign } from 'node:crypto'

import { assembleContainer, type ContainerParts } from './assemble-container'
import { signedAttributes } from './signed-attributes'

/** Signs a document's digest with the signer's private key (PKCS#8 DER, P-256) and gives the container's DER. */
export function signContainer(
  parts: Omit<ContainerParts, 'signature'> & { readonly privateKeyPkcs8: Uint8Array },
): Uint8Array {
  const key = createPrivateKey({ key: Buffer.from(parts.privateKeyPkcs8), format: 'der', type: 'pkcs8' })
  const { der } = signedAttributes(parts.documentDigest, parts.signerCertificateDer)
  const signature = sign('sha256', der, { key, dsaEncoding: 'der' })
  return assembleContainer({ ...parts, signature })
}
