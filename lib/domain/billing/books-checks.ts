import 'server-only'

import type { PaymentRow } from '@/db/repositories/payment.repo'
import type { PurchaseRow } from '@/db/repositories/purchase.repo'
import { durationText } from '@/lib/core/ledger/duration-text'
import { cents } from '@/lib/core/money/cents'
import { moneyText } from '@/lib/core/money/format-money'

import { afterMonths } from './calendar-months'

/** One thing that must hold between two books, and whether it does; what is not known yet is neither. */
export type Check = {
  readonly name: string
  readonly state: 'agrees' | 'pending' | 'differs'
  /** What was compared, with the figures where they differ. */
  readonly sentence: string
}

/** What the hour ledger holds for one block. */
export type BlockFigures = {
  readonly minutes: number
  readonly credited: number
  readonly debited: number
  readonly remaining: number
  readonly validUntil: number
}

const check = (name: string, holds: boolean, agreeing: string, differing: string): Check =>
  holds ? { name, state: 'agrees', sentence: agreeing } : { name, state: 'differs', sentence: differing }

/** Whether price, payment, the provider's booking, the credited block and its validity tell the same story. */
export function purchaseChecks(
  purchase: PurchaseRow,
  payment: PaymentRow | undefined,
  block: BlockFigures | undefined,
): Check[] {
  if (purchase.status === 'paid') {
    return [
      priceCheck(purchase, payment),
      ...(payment ? [bookingCheck(payment)] : []),
      creditCheck(purchase, block),
      ...(block ? [validityCheck(purchase, block), remainderCheck(block)] : []),
    ]
  }
  const isUntouched = payment === undefined && block === undefined
  return [check('Unpaid', isUntouched, 'Nothing moved', 'It is not paid, yet money or hours moved')]
}

function priceCheck(purchase: PurchaseRow, payment: PaymentRow | undefined): Check {
  const price = moneyText(cents(purchase.gross_cents), purchase.currency)
  const paid = payment ? moneyText(cents(payment.gross_cents), payment.currency) : 'nothing'
  return check(
    'Paid = price',
    paid === price,
    'The payment is the price',
    `Paid ${paid}, the price is ${price}`,
  )
}

function bookingCheck(payment: PaymentRow): Check {
  const name = 'Paid = fee + net'
  if (payment.settled_cents === null || payment.settled_currency === null) {
    return { name, state: 'pending', sentence: 'The provider has not told its fee yet; it is asked again' }
  }
  const paid = moneyText(cents(payment.gross_cents), payment.currency)
  const booked = moneyText(cents(payment.settled_cents), payment.settled_currency)
  return check(
    name,
    paid === booked,
    'Fee and net are what was paid',
    `Paid ${paid}, the provider booked ${booked}`,
  )
}

function creditCheck(purchase: PurchaseRow, block: BlockFigures | undefined): Check {
  const credited = block?.credited ?? 0
  return check(
    'Credit = bought',
    block?.minutes === purchase.minutes && credited === purchase.minutes,
    'The credit is the hours bought',
    `Credited ${durationText(credited)}, bought ${durationText(purchase.minutes)}`,
  )
}

function validityCheck(purchase: PurchaseRow, block: BlockFigures): Check {
  const due = purchase.paid_at === null ? null : afterMonths(purchase.paid_at, purchase.validity_months)
  return check(
    'Validity',
    block.validUntil === due,
    'The block is valid as long as was bought',
    `The block is not valid for the ${purchase.validity_months} months that were bought`,
  )
}

function remainderCheck({ credited, debited, remaining }: BlockFigures): Check {
  return check(
    'Left ≥ 0',
    remaining >= 0 && remaining <= credited,
    'What is left lies between nothing and the credit',
    `Credited ${durationText(credited)}, debited ${durationText(debited)}, left ${remaining} min`,
  )
}

/** What the ledger of one company says, beside the time that was posted and the blocks that were paid. */
export type AccountFigures = {
  readonly soldMinutes: number
  readonly creditedMinutes: number
  readonly debitedMinutes: number
  readonly postedMinutes: number
  readonly balanceMinutes: number
}

export const accountChecks = (figures: AccountFigures): Check[] => [
  check(
    'Credit = sold',
    figures.creditedMinutes === figures.soldMinutes,
    'Credits are the paid blocks',
    `Credited ${durationText(figures.creditedMinutes)}, paid for ${durationText(figures.soldMinutes)}`,
  ),
  check(
    'Debit = posted',
    figures.debitedMinutes === figures.postedMinutes,
    'Debits are the posted time',
    `Debited ${durationText(figures.debitedMinutes)}, posted ${durationText(figures.postedMinutes)}`,
  ),
  check(
    'Balance ≥ 0',
    figures.balanceMinutes >= 0,
    'The balance is not below zero',
    `The balance is ${figures.balanceMinutes} min`,
  ),
]

/** Receipts are numbered 1, 2, 3 … without a gap, one for each payment. */
export function receiptCheck(receiptNumbers: readonly number[], payments: number): Check {
  const isGapFree = [...receiptNumbers].sort((a, b) => a - b).every((number, index) => number === index + 1)
  return check(
    'Receipts',
    isGapFree && receiptNumbers.length === payments,
    `Numbered from 1 without a gap, one for each of ${payments} ${payments === 1 ? 'payment' : 'payments'}`,
    `${receiptNumbers.length} receipts for ${payments} payments, or a number is missing`,
  )
}
