import 'server-only'
import type { Insertable, Selectable } from 'kysely'

import type { Db, Tx } from '@/db/client'
import type { CompanyTable } from '@/db/tables/identity'

export type CompanyRow = Selectable<CompanyTable>

export function findCompany(db: Db, companyId: string): Promise<CompanyRow | undefined> {
  return db.selectFrom('company').selectAll().where('id', '=', companyId).executeTakeFirst()
}

export function findCompanyByName(db: Db, name: string): Promise<CompanyRow | undefined> {
  return db.selectFrom('company').selectAll().where('name', '=', name).executeTakeFirst()
}

export function listCompanies(db: Db): Promise<CompanyRow[]> {
  return db.selectFrom('company').selectAll().orderBy('name').execute()
}

export async function insertCompany(tx: Tx, company: Insertable<CompanyTable>): Promise<void> {
  await tx.insertInto('company').values(company).execute()
}
