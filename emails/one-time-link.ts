import type { Mail } from '@/lib/domain/mail'

import { link, note, paragraph, type MailContent, type Practice } from './mail-content'
import { writtenInstant } from './written-values'

type OneTimeLink = Extract<Mail, { kind: 'one_time_link' }>

const wordings = {
  invitation: {
    subject: 'Set your password',
    opening: 'One step is left: choose a password, and your account is ready.',
  },
  password_reset: {
    subject: 'Set a new password',
    opening: 'Somebody, probably you, asked to set a new password for this address.',
  },
} as const

export function oneTimeLinkMail(mail: OneTimeLink, practice: Practice): MailContent {
  const { subject, opening } = wordings[mail.purpose]
  return {
    subject: `${subject} at ${practice.name}`,
    heading: subject,
    blocks: [
      paragraph(opening),
      link(subject, mail.link),
      note(
        `The link works once, until ${writtenInstant(mail.expiresAt)}, and only in the browser that asked for it.`,
      ),
    ],
    reason:
      'You receive this because this address was entered on the sign-in pages. If that was not you, ignore it: nothing changes.',
  }
}
