import 'server-only'
import type { Insertable, Selectable } from 'kysely'

import type { Db, Tx } from '@/db/client'
import type { CompanyRole, MembershipTable, PersonTable } from '@/db/tables/identity'

export type PersonRow = Selectable<PersonTable>

export function findPersonByEmail(db: Db, email: string): Promise<PersonRow | undefined> {
  return db.selectFrom('person').selectAll().where('email', '=', email).executeTakeFirst()
}

export function findPerson(db: Db, personId: string): Promise<PersonRow | undefined> {
  return db.selectFrom('person').selectAll().where('id', '=', personId).executeTakeFirst()
}

export async function insertPerson(tx: Tx, person: Insertable<PersonTable>): Promise<void> {
  await tx.insertInto('person').values(person).execute()
}

export async function setPasswordHash(tx: Tx, personId: string, passwordHash: string): Promise<void> {
  await tx.updateTable('person').set({ password_hash: passwordHash }).where('id', '=', personId).execute()
}

export async function grantStaffRole(
  tx: Tx,
  personId: string,
  role: 'is_consultant' | 'is_administrator',
): Promise<void> {
  await tx
    .updateTable('person')
    .set({ [role]: 1 })
    .where('id', '=', personId)
    .execute()
}

export async function setDisabledAt(tx: Tx, personId: string, disabledAt: number | null): Promise<void> {
  await tx.updateTable('person').set({ disabled_at: disabledAt }).where('id', '=', personId).execute()
}

export async function upsertMembership(tx: Tx, membership: Insertable<MembershipTable>): Promise<void> {
  await tx
    .insertInto('membership')
    .values(membership)
    .onConflict((conflict) =>
      conflict.columns(['company_id', 'person_id']).doUpdateSet({ role: membership.role, removed_at: null }),
    )
    .execute()
}

export type MembershipRow = {
  readonly companyId: string
  readonly companyName: string
  readonly role: CompanyRole
  readonly acceptedVersion: number | null
}

/** Current memberships with the newest version of the confidentiality terms that the person accepted for each. */
export function listMembershipsOf(db: Db, personId: string): Promise<MembershipRow[]> {
  return db
    .selectFrom('membership')
    .innerJoin('company', 'company.id', 'membership.company_id')
    .leftJoin('confidentiality_acceptance', (join) =>
      join
        .onRef('confidentiality_acceptance.company_id', '=', 'membership.company_id')
        .onRef('confidentiality_acceptance.person_id', '=', 'membership.person_id'),
    )
    .where('membership.person_id', '=', personId)
    .where('membership.removed_at', 'is', null)
    .groupBy(['company.id', 'company.name', 'membership.role'])
    .orderBy('company.name')
    .select((select) => [
      'company.id as companyId',
      'company.name as companyName',
      'membership.role as role',
      select.fn.max('confidentiality_acceptance.version').as('acceptedVersion'),
    ])
    .execute()
}

export type ColleagueRow = {
  readonly personId: string
  readonly name: string
  readonly email: string
  readonly role: CompanyRole
}

export function listPeopleOfCompany(db: Db, companyId: string): Promise<ColleagueRow[]> {
  return db
    .selectFrom('membership')
    .innerJoin('person', 'person.id', 'membership.person_id')
    .where('membership.company_id', '=', companyId)
    .where('membership.removed_at', 'is', null)
    .where('person.disabled_at', 'is', null)
    .orderBy('person.name')
    .select(['person.id as personId', 'person.name', 'person.email', 'membership.role'])
    .execute()
}

export function listConsultants(db: Db): Promise<{ personId: string; name: string }[]> {
  return db
    .selectFrom('person')
    .where('is_consultant', '=', 1)
    .where('disabled_at', 'is', null)
    .orderBy('name')
    .select(['id as personId', 'name'])
    .execute()
}

export function listPeople(db: Db): Promise<PersonRow[]> {
  return db.selectFrom('person').selectAll().orderBy('name').execute()
}
