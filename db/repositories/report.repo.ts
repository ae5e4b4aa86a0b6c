import 'server-only'
import type { Insertable, Selectable, Updateable } from 'kysely'

import type { Db, Tx } from '@/db/client'
import type { ReportRemarkTable, ReportSignatureTable, ReportStatus, ReportTable } from '@/db/tables/reports'

export type ReportRow = Selectable<ReportTable>
export type SignatureRow = Selectable<ReportSignatureTable>

export async function insertReport(tx: Tx, report: Insertable<ReportTable>): Promise<void> {
  await tx.insertInto('report').values(report).execute()
}

export function findReport(db: Db | Tx, reportId: string): Promise<ReportRow | undefined> {
  return db.selectFrom('report').selectAll().where('id', '=', reportId).executeTakeFirst()
}

export function findReportByCode(db: Db, checkCode: string): Promise<ReportRow | undefined> {
  return db.selectFrom('report').selectAll().where('check_code', '=', checkCode).executeTakeFirst()
}

export function findReportByHash(db: Db, sha256: string): Promise<ReportRow | undefined> {
  return db.selectFrom('report').selectAll().where('file_sha256', '=', sha256).executeTakeFirst()
}

/** The report that one recorded signature belongs to; a signature states its time to the second. */
export function findReportBySignature(
  db: Db,
  fingerprint: string,
  signedAtSecond: number,
): Promise<ReportRow | undefined> {
  return db
    .selectFrom('report_signature')
    .innerJoin('report', 'report.id', 'report_signature.report_id')
    .where('report_signature.certificate_fingerprint', '=', fingerprint)
    .where('report_signature.signed_at', '>=', signedAtSecond)
    .where('report_signature.signed_at', '<', signedAtSecond + 1000)
    .selectAll('report')
    .executeTakeFirst()
}

export function listReportsOf(db: Db, engagementId: string): Promise<ReportRow[]> {
  return db
    .selectFrom('report')
    .selectAll()
    .where('engagement_id', '=', engagementId)
    .orderBy('created_at', 'desc')
    .execute()
}

/** Reports of a calendar year so far; the next number follows. */
export async function countReportNumbers(tx: Tx, prefix: string): Promise<number> {
  const row = await tx
    .selectFrom('report')
    .select((select) => select.fn.count<number>('number').distinct().as('count'))
    .where('number', 'like', `${prefix}%`)
    .executeTakeFirstOrThrow()
  return row.count
}

/**
 * Moves a report on, provided that it still stands where the caller saw it.
 * @returns false when somebody else moved it meanwhile.
 */
export async function moveReport(
  tx: Tx,
  reportId: string,
  from: readonly ReportStatus[],
  change: Updateable<ReportTable>,
): Promise<boolean> {
  const result = await tx
    .updateTable('report')
    .set(change)
    .where('id', '=', reportId)
    .where('status', 'in', [...from])
    .executeTakeFirst()
  return result.numUpdatedRows === 1n
}

export async function replaceReportFindings(
  tx: Tx,
  reportId: string,
  findingIds: readonly string[],
): Promise<void> {
  await tx.deleteFrom('report_finding').where('report_id', '=', reportId).execute()
  for (const [position, findingId] of findingIds.entries()) {
    await tx
      .insertInto('report_finding')
      .values({ report_id: reportId, finding_id: findingId, position })
      .execute()
  }
}

export async function listReportFindingIds(db: Db | Tx, reportId: string): Promise<string[]> {
  const rows = await db
    .selectFrom('report_finding')
    .select('finding_id')
    .where('report_id', '=', reportId)
    .orderBy('position')
    .execute()
  return rows.map((row) => row.finding_id)
}

export async function insertRemark(tx: Tx, remark: Insertable<ReportRemarkTable>): Promise<void> {
  await tx.insertInto('report_remark').values(remark).execute()
}

export type RemarkRow = {
  readonly section: string
  readonly text: string
  readonly authorName: string
  readonly createdAt: number
}

export function listRemarks(db: Db | Tx, reportId: string): Promise<RemarkRow[]> {
  return db
    .selectFrom('report_remark')
    .innerJoin('person', 'person.id', 'report_remark.author_id')
    .where('report_id', '=', reportId)
    .orderBy('report_remark.created_at')
    .select([
      'report_remark.section',
      'report_remark.text',
      'person.name as authorName',
      'report_remark.created_at as createdAt',
    ])
    .execute()
}

export async function insertSignature(tx: Tx, signature: Insertable<ReportSignatureTable>): Promise<void> {
  await tx.insertInto('report_signature').values(signature).execute()
}

export function listSignatures(db: Db | Tx, reportId: string): Promise<SignatureRow[]> {
  return db
    .selectFrom('report_signature')
    .selectAll()
    .where('report_id', '=', reportId)
    .orderBy('signed_at')
    .execute()
}
