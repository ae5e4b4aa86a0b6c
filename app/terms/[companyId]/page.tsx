import type { Metadata } from 'next'

import { ActionForm } from '@/components/forms/action-form'
import { FormText } from '@/components/forms/form-fields'
import { SignOutForm } from '@/components/identity/sign-out-form'
import { PublicShell } from '@/components/shell/public-shell'
import { confidentiality } from '@/lib/server/operations'
import { practiceName } from '@/lib/server/practice'
import { queryBeforeTerms } from '@/lib/server/query'

import { acceptTerms } from './actions'

export const metadata: Metadata = { title: 'Confidentiality terms' }

export default async function TermsPage({ params }: PageProps<'/terms/[companyId]'>) {
  const { companyId } = await params
  const terms = await queryBeforeTerms(confidentiality.readTerms, { companyId })
  return (
    <PublicShell practiceName={practiceName()} width="wide">
      <h1 className="text-2xl">{terms.title}</h1>
      <p className="mb-5 mt-1.5 text-sm text-ink-soft">
        Version {terms.version}, for {terms.companyName}. Your typed name, the time and your network address
        are kept as the record of your acceptance.
      </p>
      <div className="mb-6 flex max-w-measure flex-col gap-3">
        {terms.body.split('\n\n').map((paragraph) => (
          <p key={paragraph.slice(0, 40)}>{paragraph}</p>
        ))}
      </div>
      <ActionForm
        action={acceptTerms}
        hidden={{ companyId, version: String(terms.version) }}
        submitLabel="Accept the terms"
        pendingLabel="Recording…"
      >
        <FormText name="typedName" label="Your full name" autoComplete="name" />
      </ActionForm>
      <div className="mt-6 flex items-center gap-3 border-t border-rule pt-4 text-sm text-ink-soft">
        <span>Not you, or not now?</span>
        <SignOutForm />
      </div>
    </PublicShell>
  )
}
