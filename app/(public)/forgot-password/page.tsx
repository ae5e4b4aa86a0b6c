import type { Metadata } from 'next'

import { ActionForm } from '@/components/forms/action-form'
import { FormText } from '@/components/forms/form-fields'
import { PublicShell } from '@/components/shell/public-shell'
import { TextLink } from '@/components/ui/text-link'
import { practiceName } from '@/lib/server/practice'

import { askForReset } from './actions'

export const metadata: Metadata = { title: 'Set a new password' }

export default function ForgotPasswordPage() {
  return (
    <PublicShell practiceName={practiceName()}>
      <h1 className="text-2xl">Set a new password</h1>
      <p className="mb-5 mt-1.5 text-ink-soft">
        We mail you a link. It works once, for ten minutes, in this browser.
      </p>
      <ActionForm
        action={askForReset}
        submitLabel="Mail me the link"
        pendingLabel="Sending…"
        doneMessage="If this address belongs to an account, the link is on its way. Open it in this browser."
      >
        <FormText name="email" label="E-mail address" type="email" autoComplete="username" />
      </ActionForm>
      <p className="mt-6 border-t border-rule pt-4 text-sm">
        <TextLink href="/sign-in">Back to sign-in</TextLink>
      </p>
    </PublicShell>
  )
}
