import type { Metadata } from 'next'

import { ActionForm } from '@/components/forms/action-form'
import { FormText } from '@/components/forms/form-fields'
import { CheckFile } from '@/components/reports/check-file'
import { CodeAnswer } from '@/components/reports/code-answer'
import { IndependentCheck } from '@/components/reports/independent-check'
import { PublicShell } from '@/components/shell/public-shell'
import { practiceName } from '@/lib/server/practice'

import { checkCode } from './actions'

export const metadata: Metadata = { title: 'Check a signed report' }

export default function CheckPage() {
  return (
    <PublicShell practiceName={practiceName()} width="wide">
      <h1 className="text-2xl">Check a signed report</h1>
      <p className="mb-6 mt-1.5 max-w-measure text-ink-soft">
        For anybody who holds a report of {practiceName()}: see whether it is whole, unchanged and current,
        and who signed it. The file is looked at in memory and not kept.
      </p>
      <CheckFile />
      <section className="mt-8 border-t border-rule pt-5">
        <h2 className="mb-3 text-lg">Or enter the code from its last page</h2>
        <ActionForm action={checkCode} submitLabel="Look up the code" pendingLabel="Looking…" tone="plain">
          <FormText name="code" label="Check code" className="num max-w-xs" autoComplete="off" />
          <CodeAnswer />
        </ActionForm>
      </section>
      <IndependentCheck />
    </PublicShell>
  )
}
