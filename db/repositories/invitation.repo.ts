import 'server-only'
import type { Insertable, Selectable } from 'kysely'

import type { Db, Tx } from '@/db/client'
import type { InvitationTable, OneTimeLinkTable } from '@/db/tables/identity'

export type InvitationRow = Selectable<InvitationTable>
export type OneTimeLinkRow = Selectable<OneTimeLinkTable>

export async function insertInvitation(tx: Tx, invitation: Insertable<InvitationTable>): Promise<void> {
  await tx.insertInto('invitation').values(invitation).execute()
}

export function findInvitationByToken(db: Db, tokenHash: string): Promise<InvitationRow | undefined> {
  return db.selectFrom('invitation').selectAll().where('token_hash', '=', tokenHash).executeTakeFirst()
}

export function findInvitation(db: Db, invitationId: string): Promise<InvitationRow | undefined> {
  return db.selectFrom('invitation').selectAll().where('id', '=', invitationId).executeTakeFirst()
}

export function listOpenInvitations(db: Db, now: number): Promise<InvitationRow[]> {
  return db
    .selectFrom('invitation')
    .selectAll()
    .where('accepted_at', 'is', null)
    .where('expires_at', '>', now)
    .orderBy('created_at', 'desc')
    .execute()
}

export async function markInvitationAccepted(tx: Tx, invitationId: string, at: number): Promise<void> {
  await tx.updateTable('invitation').set({ accepted_at: at }).where('id', '=', invitationId).execute()
}

export async function insertOneTimeLink(tx: Tx, link: Insertable<OneTimeLinkTable>): Promise<void> {
  await tx.insertInto('one_time_link').values(link).execute()
}

export function findOneTimeLink(db: Db, tokenHash: string): Promise<OneTimeLinkRow | undefined> {
  return db.selectFrom('one_time_link').selectAll().where('token_hash', '=', tokenHash).executeTakeFirst()
}

export async function markLinkUsed(tx: Tx, linkId: string, at: number): Promise<void> {
  await tx.updateTable('one_time_link').set({ used_at: at }).where('id', '=', linkId).execute()
}
