import type { Metadata } from 'next'

import { ActionForm } from '@/components/forms/action-form'
import { PublicShell } from '@/components/shell/public-shell'
import { DescriptionList } from '@/components/ui/description-list'
import { Notice } from '@/components/ui/notice'
import { links } from '@/lib/server/operations'
import { practiceName } from '@/lib/server/practice'
import { openQuery } from '@/lib/server/query'

import { askForLink } from './actions'

export const metadata: Metadata = { title: 'Invitation' }

const roleWords = {
  purchaser: 'Purchaser: buys hours, approves scopes, invites colleagues, and works with findings',
  engineer: 'Engineer: opens engagements, uploads evidence, works with findings',
  consultant: 'Consultant of the practice',
  administrator: 'Administrator of the practice',
}

export default async function InvitationPage({ params }: PageProps<'/invitation/[token]'>) {
  const { token } = await params
  const invitation = await openQuery(links.readInvitation, { token })
  return (
    <PublicShell practiceName={practiceName()}>
      <h1 className="mb-4 text-2xl">You are invited</h1>
      {invitation.ok ? (
        <>
          <DescriptionList
            items={[
              { term: 'By', detail: practiceName() },
              ...(invitation.value.companyName
                ? [{ term: 'For', detail: invitation.value.companyName }]
                : []),
              { term: 'As', detail: roleWords[invitation.value.role] },
              { term: 'Address', detail: invitation.value.email },
            ]}
          />
          <p className="my-5 max-w-measure">
            To make sure that the address is yours, we mail it a link with which you set your password. It
            works once, for ten minutes, in this browser.
          </p>
          <ActionForm
            action={askForLink}
            hidden={{ token }}
            submitLabel="Mail me the link"
            pendingLabel="Sending…"
            doneMessage="The link is on its way. Open it in this browser within ten minutes."
          />
        </>
      ) : (
        <Notice tone="error" title="This invitation cannot be used">
          It was taken up already, is older than seven days, or the address is incomplete. Ask the person who
          invited you for a new one.
        </Notice>
      )}
    </PublicShell>
  )
}
