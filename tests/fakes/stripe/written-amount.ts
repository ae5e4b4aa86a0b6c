/** "1,200.00 EUR" for the smallest unit of a currency with two decimals. */
export const writtenAmount = (cents: number, currency: string): string =>
  `${(cents / 100).toLocaleString('en-GB', { minimumFractionDigits: 2 })} ${currency.toUpperCase()}`
