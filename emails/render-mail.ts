import type { Mail } from '@/lib/domain/mail'

import { invitationMail } from './invitation'
import type { MailContent, Practice, RenderedMail } from './mail-content'
import { layOutMail } from './mail-layout'
import { oneTimeLinkMail } from './one-time-link'
import { receiptMail } from './receipt'
import { reportReleasedMail } from './report-released'
import { scopeProposedMail } from './scope-proposed'

/** Writes a queued message out: subject, HTML and plain text. */
export const renderMail = (mail: Mail, practice: Practice): RenderedMail =>
  layOutMail(contentOf(mail, practice), practice)

function contentOf(mail: Mail, practice: Practice): MailContent {
  switch (mail.kind) {
    case 'invitation':
      return invitationMail(mail, practice)
    case 'one_time_link':
      return oneTimeLinkMail(mail, practice)
    case 'receipt':
      return receiptMail(mail, practice)
    case 'scope_proposed':
      return scopeProposedMail(mail)
    case 'report_released':
      return reportReleasedMail(mail)
  }
}
