import { stamp, type Account } from './account'
import type { WireBalanceTransaction } from './wire'

/** The fake's own rule for the fee: 2.9 % of the amount, rounded, and 30 cents. The real fee depends on the contract. */
export const feeOf = (amount: number): number => Math.round((amount * 29) / 1000) + 30

export function book(
  account: Account,
  entry: Pick<WireBalanceTransaction, 'type' | 'amount' | 'fee' | 'currency' | 'source'>,
): WireBalanceTransaction {
  const booked: WireBalanceTransaction = {
    ...stamp(account),
    id: account.newId('txn'),
    object: 'balance_transaction',
    status: 'available',
    net: entry.amount - entry.fee,
    ...entry,
  }
  account.store.balance.set(booked.id, booked)
  return booked
}
