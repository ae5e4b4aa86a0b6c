import type { FormAction } from '@/lib/core/action-state'

import { ActionForm } from '../forms/action-form'
import { FormText } from '../forms/form-fields'
import { DescriptionList } from '../ui/description-list'
import { Hash } from '../ui/hash'
import { Sheet } from '../ui/sheet'
import { Timestamp } from '../ui/timestamp'

type CertificateSheetProps = {
  readonly certificate: {
    readonly fingerprint: string
    readonly validFrom: number
    readonly validUntil: number
  } | null
  readonly create: FormAction
}

/** The consultant's signing certificate, or the form that makes one. */
export const CertificateSheet = ({ certificate, create }: CertificateSheetProps) => (
  <Sheet title="Signing certificate" id="signing">
    {certificate ? (
      <DescriptionList
        items={[
          {
            term: 'Fingerprint',
            detail: <Hash value={certificate.fingerprint} what="certificate fingerprint" />,
          },
          { term: 'Valid from', detail: <Timestamp instant={certificate.validFrom} dayOnly /> },
          { term: 'Valid until', detail: <Timestamp instant={certificate.validUntil} dayOnly /> },
        ]}
      />
    ) : (
      <ActionForm
        action={create}
        submitLabel="Make the certificate"
        pendingLabel="Making…"
        label="Make a signing certificate"
      >
        <p className="max-w-measure text-ink-soft">
          With it you sign reports as author or reviewer. Its key is locked with a passphrase that we do not
          keep: if you forget it, a new certificate has to be made.
        </p>
        <FormText name="password" label="Your password" type="password" autoComplete="current-password" />
        <FormText
          name="passphrase"
          label="New signing passphrase"
          type="password"
          autoComplete="new-password"
          hint="At least 12 characters, different from your password"
        />
      </ActionForm>
    )}
  </Sheet>
)
