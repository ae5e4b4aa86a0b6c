import 'server-only'
import { sql, type Insertable, type Selectable } from 'kysely'

import type { Db, Tx } from '@/db/client'
import type { HourBlockTable, HourLedgerEntryTable } from '@/db/tables/hours'

export type BlockRow = Selectable<HourBlockTable>
export type LedgerRow = Selectable<HourLedgerEntryTable>

export async function insertBlock(tx: Tx, block: Insertable<HourBlockTable>): Promise<void> {
  await tx.insertInto('hour_block').values(block).execute()
}

export async function insertLedgerEntry(tx: Tx, entry: Insertable<HourLedgerEntryTable>): Promise<void> {
  await tx.insertInto('hour_ledger_entry').values(entry).execute()
}

export function listBlocks(db: Db | Tx, companyId: string): Promise<BlockRow[]> {
  return db
    .selectFrom('hour_block')
    .selectAll()
    .where('company_id', '=', companyId)
    .orderBy('valid_from')
    .orderBy('id')
    .execute()
}

export function findBlockOf(
  db: Db | Tx,
  source: { readonly kind: string; readonly id: string },
): Promise<BlockRow | undefined> {
  return db
    .selectFrom('hour_block')
    .selectAll()
    .where('source_kind', '=', source.kind)
    .where('source_id', '=', source.id)
    .executeTakeFirst()
}

export type LedgerLine = LedgerRow & { readonly engagement_title: string | null }

/** Every entry of a company in the order of writing, with the engagement that a debit belongs to. */
export function listLedger(db: Db | Tx, companyId: string): Promise<LedgerLine[]> {
  return db
    .selectFrom('hour_ledger_entry')
    .leftJoin('engagement', 'engagement.id', 'hour_ledger_entry.engagement_id')
    .where('hour_ledger_entry.company_id', '=', companyId)
    .orderBy('hour_ledger_entry.created_at')
    .orderBy(sql`hour_ledger_entry.rowid`)
    .selectAll('hour_ledger_entry')
    .select('engagement.title as engagement_title')
    .execute()
}
