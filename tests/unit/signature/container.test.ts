import { createHash } from 'node:crypto'

import { OctetString } from 'asn1js'
import { AlgorithmIdentifier, Attribute, ContentInfo, SignedData } from 'pkijs'
import { beforeAll, describe, expect, it } from 'vitest'

import { readContainer } from '@/lib/signature/container/read-container'
import { signContainer } from '@/lib/signature/container/sign-container'
import { signedAttributes } from '@/lib/signature/container/signed-attributes'

import { createScene } from './signing-scene'

describe('the signature container', () => {
  const documentDigest = createHash('sha256').update('report').digest()
  let container: Uint8Array
  let signerCertificateDer: Uint8Array
  beforeAll(async () => {
    const { author, authority } = await createScene()
    signerCertificateDer = author.certificateDer
    container = signContainer({
      documentDigest,
      signerCertificateDer,
      privateKeyPkcs8: author.privateKeyPkcs8,
      authorityCertificateDer: authority.certificateDer,
    })
  })

  const changed = (change: (signedData: SignedData) => void): Uint8Array => {
    const content = ContentInfo.fromBER(Uint8Array.from(container))
    const signedData = new SignedData({ schema: content.content })
    change(signedData)
    content.content = signedData.toSchema()
    return new Uint8Array(content.toSchema().toBER())
  }

  const onlySigner = ({ signerInfos: [signer] }: SignedData) => {
    if (!signer?.signedAttrs) throw new Error('The container has no signer')
    return { signer, attributes: signer.signedAttrs }
  }

  it('is read back with the digest and the certificate that went in', () => {
    const read = readContainer(container)
    expect(read).toMatchObject({ ok: true })
    if (!read.ok) return
    expect(Buffer.from(read.value.documentDigest)).toEqual(documentDigest)
    expect(Buffer.from(read.value.signerCertificateDer)).toEqual(Buffer.from(signerCertificateDer))
  })

  it('orders the signed attributes as DER demands', () => {
    const encoded = signedAttributes(documentDigest, signerCertificateDer).attributes.map((attribute) =>
      Buffer.from(attribute.toSchema().toBER()),
    )
    expect([...encoded].sort(Buffer.compare)).toEqual(encoded)
    expect(encoded).toHaveLength(3)
  })

  it('comes through a change that changes nothing', () => {
    expect(readContainer(changed(() => undefined)).ok).toBe(true)
  })

  it.each<[string, string, RegExp, (signedData: SignedData) => void]>([
    [
      'content of its own',
      'embedded_content',
      /content of its own/,
      (data) => {
        data.encapContentInfo.eContent = new OctetString({ valueHex: new ArrayBuffer(8) })
      },
    ],
    [
      'a second signer',
      'several_signers',
      /exactly one signer/,
      (data) => data.signerInfos.push(onlySigner(data).signer),
    ],
    [
      'SHA-1',
      'other_algorithm',
      /another algorithm/,
      (data) => {
        onlySigner(data).signer.digestAlgorithm = new AlgorithmIdentifier({ algorithmId: '1.3.14.3.2.26' })
      },
    ],
    [
      'one certificate only',
      'certificates_missing',
      /authority's certificate/,
      (data) => data.certificates?.splice(0, 1),
    ],
    [
      'no signing-certificate-v2',
      'signing_certificate_missing',
      /does not bind its certificate/,
      (data) => {
        const { attributes } = onlySigner(data)
        attributes.attributes = attributes.attributes.filter(({ type }) => !type.endsWith('.2.47'))
      },
    ],
    [
      'a signing-time attribute',
      'container_not_canonical',
      /more than, or something other than/,
      (data) =>
        onlySigner(data).attributes.attributes.push(
          new Attribute({ type: '1.2.840.113549.1.9.5', values: [new OctetString()] }),
        ),
    ],
  ])('refuses %s', (_, code, sentence, change) => {
    expect(readContainer(changed(change))).toMatchObject({
      ok: false,
      error: { code, message: expect.stringMatching(sentence) },
    })
  })

  it('refuses bytes that are no container', () => {
    for (const bytes of [new Uint8Array(0), Uint8Array.of(0x30, 0x80), container.subarray(0, 100)]) {
      expect(readContainer(bytes)).toMatchObject({ ok: false, error: { code: 'container_unreadable' } })
    }
  })
})
