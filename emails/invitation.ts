import type { Mail } from '@/lib/domain/mail'

import { facts, figure, link, note, paragraph, word, type MailContent, type Practice } from './mail-content'
import { writtenInstant } from './written-values'

type Invitation = Extract<Mail, { kind: 'invitation' }>

const tasks: Readonly<Record<Invitation['role'], string>> = {
  purchaser: 'buy hours, approve scopes, read statements and invite your colleagues',
  engineer: 'ask for help, send evidence, answer questions and read findings and reports',
  consultant: 'work on the engagements that you are assigned to',
  administrator: 'look after people, the catalogue, invoices and the books',
}

export function invitationMail(invitation: Invitation, practice: Practice): MailContent {
  const company = invitation.companyName ?? practice.name
  return {
    subject: `Invitation to the portal of ${practice.name}`,
    heading: `${invitation.invitedBy} invites you to work with ${practice.name}`,
    blocks: [
      paragraph(`As ${invitation.role} for ${company} you can ${tasks[invitation.role]}.`),
      facts(
        word('Company', company),
        word('Role', invitation.role),
        figure('Open until', writtenInstant(invitation.expiresAt)),
      ),
      link('Open the invitation', invitation.link),
      note(
        'The invitation itself lets nobody in. It sends a second message to this address, with a link that sets your password.',
      ),
    ],
    reason: `You receive this because ${invitation.invitedBy} entered this address. If you do not know why, ignore it: without you nothing is created.`,
  }
}
