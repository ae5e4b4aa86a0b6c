import 'server-only'
import type { Insertable, Selectable } from 'kysely'

import type { Db, Tx } from '@/db/client'
import type { PracticeAuthorityTable, SigningCertificateTable } from '@/db/tables/reports'

export type AuthorityRow = Selectable<PracticeAuthorityTable>
export type CertificateRow = Selectable<SigningCertificateTable>

export function findAuthority(db: Db): Promise<AuthorityRow | undefined> {
  return db.selectFrom('practice_authority').selectAll().executeTakeFirst()
}

/** Keeps the first authority that was made, should two be made at the same time. */
export async function insertAuthority(tx: Tx, authority: Insertable<PracticeAuthorityTable>): Promise<void> {
  await tx
    .insertInto('practice_authority')
    .values(authority)
    .onConflict((conflict) => conflict.doNothing())
    .execute()
}

export async function insertCertificate(
  tx: Tx,
  certificate: Insertable<SigningCertificateTable>,
): Promise<void> {
  await tx.insertInto('signing_certificate').values(certificate).execute()
}

/** The certificate that a person signs with now: the newest that is valid and not revoked. */
export function findUsableCertificate(
  db: Db,
  personId: string,
  now: number,
): Promise<CertificateRow | undefined> {
  return db
    .selectFrom('signing_certificate')
    .selectAll()
    .where('person_id', '=', personId)
    .where('revoked_at', 'is', null)
    .where('valid_from', '<=', now)
    .where('valid_until', '>', now)
    .orderBy('created_at', 'desc')
    .limit(1)
    .executeTakeFirst()
}
