import { createCipheriv, createDecipheriv, randomBytes, scrypt } from 'node:crypto'
import { promisify } from 'node:util'

import { z } from 'zod'

import { err, ok, type Result } from '@/lib/core/result'

/**
 * A private key at rest, safe to store as JSON: AES-256-GCM (NIST SP 800-38D) under a key derived from the signer's
 * passphrase by scrypt (RFC 7914), bound to one certificate. The parameters are fixed by the version and never taken
 * from the stored form, so that a changed row cannot ask for weak or endless work.
 */
const base64 = (bytes: number) => z.base64().refine((text) => Buffer.from(text, 'base64').length === bytes)

export const sealedKeySchema = z.strictObject({
  version: z.literal(1),
  derivation: z.literal('scrypt-n15-r8-p1'),
  cipher: z.literal('aes-256-gcm'),
  salt: base64(16),
  nonce: base64(12),
  tag: base64(16),
  ciphertext: z.base64().max(4096),
})

export type SealedKey = z.output<typeof sealedKeySchema>

export type OpenKeyError = {
  readonly code: 'wrong_passphrase' | 'sealed_key_unreadable'
  readonly message: string
}

const SCRYPT = { N: 2 ** 15, r: 8, p: 1, maxmem: 64 * 1024 * 1024 } as const
const deriveBytes = promisify<string, Uint8Array, number, typeof SCRYPT, Buffer>(scrypt)

/** One passphrase has one form, whichever keyboard composed its accents (Unicode NFKC). */
const deriveKey = (passphrase: string, salt: Uint8Array): Promise<Buffer> =>
  deriveBytes(passphrase.normalize('NFKC'), salt, 32, SCRYPT)

/** Seals a private key (PKCS#8 DER) under a passphrase, bound to the certificate with the given fingerprint. */
export async function sealPrivateKey(input: {
  readonly privateKeyPkcs8: Uint8Array
  readonly passphrase: string
  readonly certificateFingerprint: string
}): Promise<SealedKey> {
  const salt = randomBytes(16)
  const nonce = randomBytes(12)
  const cipher = createCipheriv('aes-256-gcm', await deriveKey(input.passphrase, salt), nonce)
  cipher.setAAD(Buffer.from(input.certificateFingerprint, 'hex'))
  const ciphertext = Buffer.concat([cipher.update(input.privateKeyPkcs8), cipher.final()])
  return {
    version: 1,
    derivation: 'scrypt-n15-r8-p1',
    cipher: 'aes-256-gcm',
    salt: salt.toString('base64'),
    nonce: nonce.toString('base64'),
    tag: cipher.getAuthTag().toString('base64'),
    ciphertext: ciphertext.toString('base64'),
  }
}

/**
 * Opens a sealed key and gives the private key as PKCS#8 DER.
 * Errors: `wrong_passphrase` (also for a changed ciphertext or another certificate, which cannot be told apart),
 * `sealed_key_unreadable` (the stored form itself is broken or of an unknown version).
 */
export async function openSealedKey(input: {
  readonly sealedKey: unknown
  readonly passphrase: string
  readonly certificateFingerprint: string
}): Promise<Result<Uint8Array, OpenKeyError>> {
  const sealed = sealedKeySchema.safeParse(input.sealedKey)
  if (!sealed.success) {
    return err({
      code: 'sealed_key_unreadable',
      message: 'The stored signing key cannot be read. Ask an administrator for a new signing certificate.',
    })
  }
  const { salt, nonce, tag, ciphertext } = sealed.data
  const key = await deriveKey(input.passphrase, Buffer.from(salt, 'base64'))
  const decipher = createDecipheriv('aes-256-gcm', key, Buffer.from(nonce, 'base64'), { authTagLength: 16 })
  decipher.setAAD(Buffer.from(input.certificateFingerprint, 'hex'))
  decipher.setAuthTag(Buffer.from(tag, 'base64'))
  try {
    const opened = Buffer.concat([decipher.update(Buffer.from(ciphertext, 'base64')), decipher.final()])
    return ok(Uint8Array.from(opened))
  } catch {
    // The cipher says only that the tag does not fit.
    return err({
      code: 'wrong_passphrase',
      message: 'That is not the passphrase of this signing key. Type it again.',
    })
  }
}
