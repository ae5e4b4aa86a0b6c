import type { Mail } from '@/lib/domain/mail'

import { facts, paragraph, type MailContent, type Practice } from './mail-content'
import { writtenDay, writtenHours, writtenMoney } from './written-values'

type Receipt = Extract<Mail, { kind: 'receipt' }>

export function receiptMail(receipt: Receipt, practice: Practice): MailContent {
  const money = (cents: number) => writtenMoney(cents, receipt.currency)
  return {
    subject: `Receipt ${receipt.receiptNumber} from ${practice.name}`,
    heading: `Receipt ${receipt.receiptNumber}`,
    blocks: [
      paragraph(
        `Thank you. ${writtenHours(receipt.minutes)} were added to the account of ${receipt.companyName}.`,
      ),
      facts(
        { label: 'Block', value: receipt.title },
        { label: 'Hours', value: writtenHours(receipt.minutes) },
        { label: 'Paid on', value: writtenDay(receipt.paidAt) },
        { label: 'Net', value: money(receipt.netCents) },
        { label: receipt.taxLabel, value: money(receipt.taxCents) },
        { label: 'Total paid', value: money(receipt.grossCents), isTotal: true },
      ),
      facts(
        { label: 'Balance after this purchase', value: writtenHours(receipt.balanceMinutes) },
        { label: 'These hours are valid until', value: writtenDay(receipt.validUntil) },
      ),
    ],
    reason: `You receive this because you bought hours for ${receipt.companyName}.`,
  }
}
