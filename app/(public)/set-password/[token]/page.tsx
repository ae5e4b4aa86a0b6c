import type { Metadata } from 'next'

import { ActionForm } from '@/components/forms/action-form'
import { FormText } from '@/components/forms/form-fields'
import { PublicShell } from '@/components/shell/public-shell'
import { Notice } from '@/components/ui/notice'
import { TextLink } from '@/components/ui/text-link'
import { links } from '@/lib/server/operations'
import { practiceName } from '@/lib/server/practice'
import { openQuery } from '@/lib/server/query'

import { setPassword } from './actions'

export const metadata: Metadata = { title: 'Set your password' }

export default async function SetPasswordPage({ params }: PageProps<'/set-password/[token]'>) {
  const { token } = await params
  const link = await openQuery(links.readPasswordLink, { token })
  return (
    <PublicShell practiceName={practiceName()}>
      <h1 className="mb-5 text-2xl">Set your password</h1>
      {link.ok ? (
        <ActionForm
          action={setPassword}
          hidden={{ token }}
          submitLabel="Set the password"
          pendingLabel="Setting…"
        >
          <p>
            For <strong>{link.value.email}</strong>
          </p>
          {link.value.needsName ? (
            <FormText
              name="name"
              label="Your name"
              hint="As it should appear in reports"
              autoComplete="name"
            />
          ) : null}
          <FormText
            name="password"
            label="New password"
            type="password"
            hint="At least 12 characters; a few unrelated words are good"
            autoComplete="new-password"
          />
        </ActionForm>
      ) : (
        <Notice tone="error" title="This link cannot be used">
          <p>{link.error.message}</p>
          <p className="mt-2">
            <TextLink href="/forgot-password">Ask for a new link</TextLink>
          </p>
        </Notice>
      )}
    </PublicShell>
  )
}
