import type { Metadata } from 'next'

import { SignInForm } from '@/components/identity/sign-in-form'
import { PublicShell } from '@/components/shell/public-shell'
import { TextLink } from '@/components/ui/text-link'
import { practiceName } from '@/lib/server/practice'

export const metadata: Metadata = { title: 'Sign in' }

export default function SignInPage() {
  return (
    <PublicShell practiceName={practiceName()}>
      <h1 className="text-2xl">Sign in</h1>
      <p className="mb-5 mt-1.5 text-ink-soft">
        Your engagements, evidence, findings and signed reports, in one place.
      </p>
      <SignInForm />
      <p className="mt-6 flex flex-wrap gap-x-6 gap-y-2 border-t border-rule pt-4 text-sm">
        <TextLink href="/forgot-password">Set a new password</TextLink>
        <TextLink href="/check">Check a signed report</TextLink>
      </p>
    </PublicShell>
  )
}
