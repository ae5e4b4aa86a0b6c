import { createPrivateKey, X509Certificate } from 'node:crypto'

import { describe, expect, it } from 'vitest'

import { readCertificate } from '@/lib/signature/certificates/certificate-facts'
import { createPracticeAuthority } from '@/lib/signature/practice-authority'
import { issueSigningCertificate } from '@/lib/signature/signing-certificate'

import { createScene, NOW, valueOf } from './signing-scene'

const YEAR = 365 * 24 * 3_600_000

describe("the practice's certificates", () => {
  it('are an authority for certificates and people for signatures', async () => {
    const { authority, author, reviewer } = await createScene()
    const [root, person] = [
      new X509Certificate(authority.certificateDer),
      new X509Certificate(author.certificateDer),
    ]
    expect(root.ca).toBe(true)
    expect(root.verify(root.publicKey)).toBe(true)
    expect(person.ca).toBe(false)
    expect(person.checkIssued(root) && person.verify(root.publicKey)).toBe(true)
    expect(person.subjectAltName).toBe('email:ada@tarnhollow.example')
    expect(
      person.checkPrivateKey(
        createPrivateKey({ key: Buffer.from(author.privateKeyPkcs8), format: 'der', type: 'pkcs8' }),
      ),
    ).toBe(true)
    expect(person.publicKey.asymmetricKeyDetails?.namedCurve).toBe('prime256v1')
    expect(readCertificate(reviewer.certificateDer)).toMatchObject({
      commonName: 'Bo Müller, Dr.',
      email: 'bo@tarnhollow.example',
      serialNumber: reviewer.serialNumber,
      fingerprint: reviewer.fingerprint,
      notBefore: reviewer.notBefore,
      notAfter: reviewer.notAfter,
      isAuthority: false,
    })
  })

  it('have serial numbers of their own', async () => {
    const { authority, author, reviewer } = await createScene()
    const serials = [authority, author, reviewer].map(({ serialNumber }) => serialNumber)
    expect(new Set(serials).size).toBe(3)
    for (const serial of serials) expect(serial).toMatch(/^[4-7][0-9a-f]{31}$/)
  })

  it('end with the authority at the latest', async () => {
    const authority = valueOf(
      await createPracticeAuthority({ practiceName: 'P', now: NOW, notAfter: NOW + YEAR }),
    )
    const person = { practiceName: 'P', personName: 'Ada Example', email: 'ada@p.example', authority }
    const issued = valueOf(await issueSigningCertificate({ ...person, now: NOW, notAfter: NOW + 2 * YEAR }))
    expect(issued.notAfter).toBe(authority.notAfter)
    const late = await issueSigningCertificate({ ...person, now: NOW + 2 * YEAR, notAfter: NOW + 3 * YEAR })
    expect(late).toMatchObject({ ok: false, error: { code: 'authority_not_valid' } })
  })

  it('refuse names and addresses that do not fit', async () => {
    const { authority } = await createScene()
    const input = {
      authority,
      practiceName: 'P',
      personName: 'Ada',
      email: 'ada@p.example',
      now: NOW,
      notAfter: NOW + YEAR,
    }
    for (const personName of ['', ' ', 'x'.repeat(65), 'a\u0000b']) {
      const refused = await issueSigningCertificate({ ...input, personName })
      expect(refused).toMatchObject({ ok: false, error: { code: 'name_unusable' } })
    }
    const refused = await issueSigningCertificate({ ...input, email: 'ädä@p.example' })
    expect(refused).toMatchObject({ ok: false, error: { code: 'email_unusable' } })
  })

  it('are not read from bytes that are more or less than one certificate', async () => {
    const { authority } = await createScene()
    expect(readCertificate(authority.certificateDer.subarray(0, 50))).toBeNull()
    expect(readCertificate(Buffer.concat([authority.certificateDer, Buffer.from([0])]))).toBeNull()
  })
})
