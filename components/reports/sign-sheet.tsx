import type { FormAction } from '@/lib/core/action-state'

import { ActionForm } from '../forms/action-form'
import { FormText } from '../forms/form-fields'
import { Notice } from '../ui/notice'
import { Sheet } from '../ui/sheet'
import { TextLink } from '../ui/text-link'

type SignSheetProps = {
  readonly reportId: string
  readonly hasCertificate: boolean
  readonly sign: FormAction
}

/** Signing asks again who is there: the account's password, and the passphrase of the signing key. */
export const SignSheet = ({ reportId, hasCertificate, sign }: SignSheetProps) => (
  <Sheet title="Sign the report">
    {hasCertificate ? (
      <ActionForm action={sign} hidden={{ reportId }} submitLabel="Sign the report" pendingLabel="Signing…">
        <FormText name="password" label="Your password" type="password" autoComplete="current-password" />
        <FormText name="passphrase" label="Your signing passphrase" type="password" autoComplete="off" />
      </ActionForm>
    ) : (
      <Notice tone="info" title="You have no signing certificate yet">
        Make one on <TextLink href="/account#signing">your account page</TextLink>, then come back and sign.
      </Notice>
    )}
  </Sheet>
)
