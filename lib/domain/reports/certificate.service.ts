import 'server-only'

import { findUsableCertificate, insertCertificate } from '@/db/repositories/certificate.repo'
import { withTx } from '@/db/tx'
import { authorize } from '@/lib/authz/authorize'
import { practice } from '@/lib/authz/resource'
import { err, ok } from '@/lib/core/result'
import { sealPrivateKey } from '@/lib/signature/sealed-key'
import { issueSigningCertificate } from '@/lib/signature/signing-certificate'

import { noInput } from '../form-fields'
import { verifyPassword } from '../identity/sign-in.service'
import { operation } from '../operation'
import { openAuthority } from './practice-authority'
import { signingFailed } from './reports.errors'
import { createCertificateSchema } from './reports.schema'

const twoYears = 2 * 365 * 864e5

/** The certificate that the person signs with now, or null. */
export const myCertificate = operation('reports.myCertificate', noInput, async (deps, actor) => {
  const allowed = authorize(actor, 'certificate.create', practice)
  if (!allowed.ok) return allowed
  const row = await findUsableCertificate(deps.db, actor.personId, deps.clock.now())
  if (!row) return ok(null)
  return ok({ fingerprint: row.fingerprint, validFrom: row.valid_from, validUntil: row.valid_until })
})

/**
 * Issues a signing certificate whose key is sealed under the person's own passphrase, which is kept nowhere. The
 * account's password is asked again.
 */
export const createCertificate = operation(
  'reports.createCertificate',
  createCertificateSchema,
  async (deps, actor, input) => {
    const allowed = authorize(actor, 'certificate.create', practice)
    if (!allowed.ok) return allowed
    const person = await verifyPassword(deps, actor.email, input.password)
    if (!person.ok) return person
    const now = deps.clock.now()
    const authority = await openAuthority(deps)
    const issued = await issueSigningCertificate({
      authority,
      practiceName: deps.settings.practiceName,
      personName: actor.name,
      email: actor.email,
      now,
      notAfter: now + twoYears,
    })
    if (!issued.ok) return err(signingFailed(issued.error.message))
    const { certificatePem, privateKeyPkcs8, fingerprint, serialNumber, notBefore, notAfter } = issued.value
    const sealed = await sealPrivateKey({
      privateKeyPkcs8,
      passphrase: input.passphrase,
      certificateFingerprint: fingerprint,
    })
    await withTx(deps.db, (tx) =>
      insertCertificate(tx, {
        id: deps.ids.newId(),
        person_id: actor.personId,
        certificate_pem: certificatePem,
        fingerprint,
        serial: serialNumber,
        sealed_key: JSON.stringify(sealed),
        valid_from: notBefore,
        valid_until: notAfter,
        created_at: now,
        revoked_at: null,
      }),
    )
    return ok({ fingerprint, validUntil: notAfter })
  },
)
