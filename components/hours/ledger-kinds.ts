/** The words for the movements of a ledger. */
const words: Readonly<Record<string, string>> = {
  credit: 'Credit',
  debit: 'Debit',
  reversal: 'Reversal',
  expiry: 'Expiry',
  adjustment: 'Adjustment',
}

export const ledgerKindLabel = (kind: string): string => words[kind] ?? kind
