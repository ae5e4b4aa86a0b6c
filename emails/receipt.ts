import type { Mail } from '@/lib/domain/mail'

import { facts, figure, paragraph, total, word, type MailContent, type Practice } from './mail-content'
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
        word('Block', receipt.title),
        figure('Hours', writtenHours(receipt.minutes)),
        figure('Paid on', writtenDay(receipt.paidAt)),
        figure('Net', money(receipt.netCents)),
        figure(receipt.taxLabel, money(receipt.taxCents)),
        total('Total paid', money(receipt.grossCents)),
      ),
      facts(
        figure('Balance after this purchase', writtenHours(receipt.balanceMinutes)),
        figure('These hours are valid until', writtenDay(receipt.validUntil)),
      ),
    ],
    reason: `You receive this because you bought hours for ${receipt.companyName}.`,
  }
}
