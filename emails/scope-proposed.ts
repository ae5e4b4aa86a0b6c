import type { Mail } from '@/lib/domain/mail'

import { facts, figure, link, note, paragraph, word, type MailContent } from './mail-content'
import { writtenHours } from './written-values'

type ScopeProposed = Extract<Mail, { kind: 'scope_proposed' }>

export function scopeProposedMail(scope: ScopeProposed): MailContent {
  return {
    subject: `Scope to approve: ${scope.engagementTitle}`,
    heading: 'A scope waits for your approval',
    blocks: [
      paragraph(`${scope.proposedBy} has written down what is to be done and how long it may take at most.`),
      facts(
        word('Engagement', scope.engagementTitle),
        word('Proposed by', scope.proposedBy),
        figure('Hours at most', writtenHours(scope.capMinutes)),
      ),
      link('Read the scope', scope.link),
      note('No time is booked under this scope before you approve it, and none past its cap.'),
    ],
    reason: 'You receive this because you approve scopes for your company.',
  }
}
