import { Quantity } from './quantity'

type MoneyProps = {
  /** Integer cents; negative for a refund or a reversal. */
  readonly cents: number
  /** ISO 4217 code. */
  readonly currency: string
}

/** 1,234.50: the same on the server and in every browser, whatever the locale. */
export const moneyDigits = (cents: number): string => {
  const whole = Math.floor(Math.abs(cents) / 100).toString()
  const grouped = whole.replace(/\B(?=(\d{3})+$)/g, ',')
  const rest = (Math.abs(cents) % 100).toString().padStart(2, '0')
  return `${cents < 0 ? '−' : ''}${grouped}.${rest}`
}

export const Money = ({ cents, currency }: MoneyProps) => (
  <Quantity value={moneyDigits(cents)} unit={currency} />
)
