import { describe, expect, it } from 'vitest'

import { openSealedKey, sealPrivateKey } from '@/lib/signature/sealed-key'

describe('a signing key at rest', () => {
  const privateKeyPkcs8 = Uint8Array.from({ length: 138 }, (_, index) => index)
  const certificateFingerprint = 'ab'.repeat(32)
  const seal = () => sealPrivateKey({ privateKeyPkcs8, passphrase: 'copper café', certificateFingerprint })

  it('opens again with the passphrase, after a trip through JSON, however its accents were typed', async () => {
    const sealedKey: unknown = JSON.parse(JSON.stringify(await seal()))
    for (const passphrase of ['copper café', 'copper cafe\u0301']) {
      const opened = await openSealedKey({ sealedKey, passphrase, certificateFingerprint })
      expect(opened).toEqual({ ok: true, value: privateKeyPkcs8 })
    }
  })

  it('stays closed to another passphrase, for another certificate and after a change', async () => {
    const sealedKey = await seal()
    const passphrase = 'copper café'
    const ciphertext = `${sealedKey.ciphertext.startsWith('A') ? 'B' : 'A'}${sealedKey.ciphertext.slice(1)}`
    for (const attempt of [
      { sealedKey, passphrase: 'copper', certificateFingerprint },
      { sealedKey, passphrase, certificateFingerprint: 'cd'.repeat(32) },
      { sealedKey: { ...sealedKey, ciphertext }, passphrase, certificateFingerprint },
    ]) {
      expect(await openSealedKey(attempt)).toMatchObject({ ok: false, error: { code: 'wrong_passphrase' } })
    }
  })

  it('never holds the key in clear, and never seals twice alike', async () => {
    const [first, second] = [await seal(), await seal()]
    expect(first.ciphertext).not.toBe(second.ciphertext)
    expect(
      Buffer.from(first.ciphertext, 'base64').includes(Buffer.from(privateKeyPkcs8.subarray(0, 8))),
    ).toBe(false)
  })

  it('refuses a stored form of another version, with weaker parameters, or broken', async () => {
    const sealedKey = await seal()
    for (const broken of [
      { ...sealedKey, version: 2 },
      { ...sealedKey, n: 2 },
      { ...sealedKey, tag: sealedKey.tag.slice(0, 8) },
      null,
      'x',
    ]) {
      const opened = await openSealedKey({
        sealedKey: broken,
        passphrase: 'copper café',
        certificateFingerprint,
      })
      expect(opened).toMatchObject({ ok: false, error: { code: 'sealed_key_unreadable' } })
    }
  })
})
