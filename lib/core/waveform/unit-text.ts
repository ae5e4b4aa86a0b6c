import { prefixExponents } from '../units/si-prefix'

/** A unit as written in a file: what it measures, and the power of ten of its prefix. */
export type WrittenUnit = { readonly unit: 's' | 'Hz' | 'V' | 'A'; readonly exponent: number }

/** Spellings of the units without a prefix. */
const whole: Readonly<Record<string, WrittenUnit['unit']>> = {
  s: 's',
  sec: 's',
  second: 's',
  seconds: 's',
  Hz: 'Hz',
  Sa: 'Hz',
  V: 'V',
  volt: 'V',
  volts: 'V',
  A: 'A',
  amp: 'A',
  amps: 'A',
  ampere: 'A',
  amperes: 'A',
}

const prefixed = /^(.)(s|Hz|V|A)$/u

/** Reads "mV", "µs", "Volts"; null for anything else. */
export function unitOf(text: string): WrittenUnit | null {
  const trimmed = text.trim()
  const unit = whole[trimmed] ?? whole[trimmed.toLowerCase().length > 2 ? trimmed.toLowerCase() : trimmed]
  if (unit !== undefined) return { unit, exponent: 0 }
  const [, prefix = '', symbol = ''] = prefixed.exec(trimmed) ?? []
  const exponent = prefixExponents[prefix]
  const base = whole[symbol]
  return base === undefined || exponent === undefined ? null : { unit: base, exponent }
}

/** A value in the unit without its prefix; dividing keeps 48000 mV at exactly 48 V where a factor of 0.001 would not. */
export const withoutPrefix = (value: number, exponent: number): number =>
  exponent < 0 ? value / 10 ** -exponent : value * 10 ** exponent
