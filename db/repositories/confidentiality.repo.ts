import 'server-only'
import type { Insertable, Selectable } from 'kysely'

import type { Db, Tx } from '@/db/client'
import type { ConfidentialityAcceptanceTable, ConfidentialityTermsTable } from '@/db/tables/identity'

export type TermsRow = Selectable<ConfidentialityTermsTable>

/** The version in force, or nothing where the practice has published none. */
export function findCurrentTerms(db: Db): Promise<TermsRow | undefined> {
  return db
    .selectFrom('confidentiality_terms')
    .selectAll()
    .orderBy('version', 'desc')
    .limit(1)
    .executeTakeFirst()
}

export async function insertTerms(tx: Tx, terms: Insertable<ConfidentialityTermsTable>): Promise<void> {
  await tx.insertInto('confidentiality_terms').values(terms).execute()
}

export async function insertAcceptance(
  tx: Tx,
  acceptance: Insertable<ConfidentialityAcceptanceTable>,
): Promise<void> {
  await tx
    .insertInto('confidentiality_acceptance')
    .values(acceptance)
    .onConflict((conflict) => conflict.doNothing())
    .execute()
}
