import type { Mail } from '@/lib/domain/mail'

import { facts, figure, link, note, paragraph, word, type MailContent } from './mail-content'

type ReportReleased = Extract<Mail, { kind: 'report_released' }>

export function reportReleasedMail(report: ReportReleased): MailContent {
  const name = `Report ${report.reportNumber}, revision ${report.revision}`
  return {
    subject: `${name}: ${report.engagementTitle}`,
    heading: `${name} is released`,
    blocks: [
      paragraph('It was reviewed and signed by its author and by a reviewer who did not write it.'),
      facts(
        word('Engagement', report.engagementTitle),
        word('Report', report.reportNumber),
        figure('Revision', String(report.revision)),
        figure('Check code', report.checkCode),
      ),
      link('Open the report', report.link),
      paragraph('Anybody who holds the file can check its signatures, and whether it is still current.'),
      link('Check a copy', report.checkLink),
      note(
        'Its results are engineering estimates, not a statement of conformity: that is for an accredited laboratory under the standard and edition in force.',
      ),
    ],
    reason: 'You receive this because you take part in this engagement.',
  }
}
