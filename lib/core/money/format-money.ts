import type { Cents } from './cents'

/** An amount for the eye: its digits, and the code of its currency, apart so that they can be set differently. */
export type FormattedMoney = { readonly number: string; readonly currency: string }

/**
 * Writes an amount of a currency with two decimals: −123450 of EUR becomes "−1,234.50" "EUR". The same on every machine
 * and in every browser, whatever their locale. The minus is U+2212.
 */
export function formatMoney(amount: Cents, currency: string): FormattedMoney {
  const size = Math.abs(amount)
  const whole = String(Math.floor(size / 100)).replace(/\B(?=(\d{3})+$)/gu, ',')
  const rest = String(size % 100).padStart(2, '0')
  return { number: `${amount < 0 ? '\u2212' : ''}${whole}.${rest}`, currency: currency.toUpperCase() }
}

/** As `formatMoney`, as one text with a no-break space: "1,234.50 EUR". */
export function moneyText(amount: Cents, currency: string): string {
  const formatted = formatMoney(amount, currency)
  return `${formatted.number}\u00a0${formatted.currency}`
}
