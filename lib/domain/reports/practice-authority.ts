import 'server-only'

import { findAuthority, insertAuthority } from '@/db/repositories/certificate.repo'
import { withTx } from '@/db/tx'
import { createPracticeAuthority } from '@/lib/signature/practice-authority'
import { openSealedKey, sealPrivateKey } from '@/lib/signature/sealed-key'

import type { Deps } from '../deps'

const years = 365.25 * 864e5

export type OpenedAuthority = { readonly certificateDer: Uint8Array; readonly privateKeyPkcs8: Uint8Array }

/** The DER bytes of a certificate in PEM text. */
export const derOf = (pem: string): Uint8Array =>
  new Uint8Array(Buffer.from(pem.replace(/-----[A-Z ]+-----|\s/g, ''), 'base64'))

/** The certificate that every signature of the practice chains to; undefined before the first was made. */
export async function authorityCertificate(
  deps: Pick<Deps, 'db'>,
): Promise<{ der: Uint8Array; fingerprint: string } | undefined> {
  const row = await findAuthority(deps.db)
  return row ? { der: derOf(row.certificate_pem), fingerprint: row.fingerprint } : undefined
}

/** The practice's authority with its key, made at the first use and sealed under the practice's own passphrase. */
export async function openAuthority(deps: Deps): Promise<OpenedAuthority> {
  const row = (await findAuthority(deps.db)) ?? (await makeAuthority(deps))
  const opened = await openSealedKey({
    sealedKey: JSON.parse(row.sealed_key),
    passphrase: deps.settings.authorityPassphrase,
    certificateFingerprint: row.fingerprint,
  })
  // The passphrase is a setting of the practice: a wrong one is for its operator, not for the person who signs.
  if (!opened.ok)
    throw new Error(`AUTHORITY_PASSPHRASE does not open the practice's authority: ${opened.error.code}`)
  return { certificateDer: derOf(row.certificate_pem), privateKeyPkcs8: opened.value }
}

async function makeAuthority(deps: Deps) {
  const now = deps.clock.now()
  const { practiceName, authorityPassphrase } = deps.settings
  const made = await createPracticeAuthority({ practiceName, now, notAfter: now + 20 * years })
  if (!made.ok) throw new Error(`PRACTICE_NAME cannot stand in a certificate: ${made.error.message}`)
  const { certificatePem, privateKeyPkcs8, fingerprint } = made.value
  const sealed = await sealPrivateKey({
    privateKeyPkcs8,
    passphrase: authorityPassphrase,
    certificateFingerprint: fingerprint,
  })
  await withTx(deps.db, (tx) =>
    insertAuthority(tx, {
      id: 1,
      certificate_pem: certificatePem,
      fingerprint,
      sealed_key: JSON.stringify(sealed),
      created_at: now,
    }),
  )
  const kept = await findAuthority(deps.db)
  if (!kept) throw new Error('The authority that was just made is missing')
  return kept
}
