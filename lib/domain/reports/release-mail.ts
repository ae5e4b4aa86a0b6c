import 'server-only'

import type { Tx } from '@/db/client'
import { listClientsOn } from '@/db/repositories/engagement-people.repo'
import { listPeopleOfCompany } from '@/db/repositories/person.repo'
import type { ReportRow } from '@/db/repositories/report.repo'

import type { Deps } from '../deps'
import type { LoadedEngagement } from '../engagements/engagement-resource'
import { queueMail } from '../mail'

/** Tells the purchasers of the company and its engineers on the engagement that the signed report is there. */
export async function mailRelease(
  tx: Tx,
  deps: Deps,
  report: ReportRow,
  { row, resource }: LoadedEngagement,
): Promise<void> {
  const people = await listPeopleOfCompany(tx, resource.companyId)
  const engaged = new Set((await listClientsOn(tx, row.id)).map((client) => client.personId))
  const { publicUrl } = deps.settings
  for (const person of people) {
    if (person.role !== 'purchaser' && !engaged.has(person.personId)) continue
    await queueMail(tx, deps, {
      to: person.email,
      dedupeKey: `report-released:${report.id}:${person.personId}`,
      mail: {
        kind: 'report_released',
        engagementTitle: row.title,
        reportNumber: report.number,
        revision: report.revision,
        link: `${publicUrl}/engagements/${row.id}/reports/${report.id}`,
        checkLink: `${publicUrl}/check`,
        checkCode: report.check_code,
      },
    })
  }
}
