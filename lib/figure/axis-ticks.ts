import { scaleLinear } from 'd3-scale'

import { engineeringScale, plainNumber, roundLabel } from './engineering-label'

export type Tick = { readonly value: number; readonly label: string; readonly rank: number }

export type AxisTicks = {
  /** Where text may stand, best first by `rank`; the layout drops those for which there is no room. */
  readonly ticks: readonly Tick[]
  readonly major: readonly number[]
  readonly minor: readonly number[]
  /** The unit for the axis title; empty when every tick carries its own. */
  readonly titleUnit: string
}

const decimalsOf = (step: number): number => Math.max(0, -Math.floor(Math.log10(step) + 1e-9))

/** Evenly spaced ticks at 1, 2 or 5 times a power of ten, all under one prefix that the title states. */
export const linearTicks = (domain: readonly [number, number], unit: string, count: number): AxisTicks => {
  const values = scaleLinear().domain(domain).ticks(Math.max(2, count))
  const scale = engineeringScale(Math.max(Math.abs(domain[0]), Math.abs(domain[1])), unit)
  const factor = 10 ** scale.exponent
  const step = (values[1] ?? 1) - (values[0] ?? 0)
  const decimals = decimalsOf(Math.abs(step) / factor)
  return {
    ticks: values.map((value) => ({ value, label: plainNumber(value / factor, decimals), rank: 0 })),
    major: values,
    minor: [],
    titleUnit: scale.unit,
  }
}

const mantissaRank: Readonly<Record<number, number>> = {
  1: 0,
  3: 2,
  2: 3,
  5: 3,
  7: 5,
  4: 6,
  6: 6,
  8: 6,
  9: 7,
}

/** The multiples 1 to 9 of every decade inside the domain, with a hair of tolerance at its ends. */
const decadeMultiples = ([low, high]: readonly [number, number]) => {
  const multiples: { value: number; mantissa: number }[] = []
  for (let decade = Math.floor(Math.log10(low) + 1e-9); decade <= Math.ceil(Math.log10(high)); decade += 1) {
    for (let mantissa = 1; mantissa <= 9; mantissa += 1) {
      const value = Number(`${mantissa}e${decade}`)
      if (value >= low * (1 - 1e-9) && value <= high * (1 + 1e-9)) multiples.push({ value, mantissa })
    }
  }
  return multiples
}

/** Ticks of a logarithmic axis: decades first, then its round ends, then 3, 2 and 5, each with its own prefix and unit. */
export const logTicks = (domain: readonly [number, number], unit: string, count: number): AxisTicks => {
  const multiples = decadeMultiples(domain)
  if (multiples.length < 3) {
    // Within a fraction of a decade even steps read better than multiples of a power of ten.
    const even = linearTicks(domain, unit, count)
    return {
      ...even,
      ticks: even.major.map((value) => ({ value, label: roundLabel(value, unit), rank: 0 })),
      titleUnit: '',
    }
  }
  const isEnd = (value: number) =>
    Math.abs(value / domain[0] - 1) < 1e-9 || Math.abs(value / domain[1] - 1) < 1e-9
  return {
    ticks: multiples.map(({ value, mantissa }) => ({
      value,
      label: roundLabel(value, unit),
      rank: isEnd(value) ? 1 : (mantissaRank[mantissa] ?? 7),
    })),
    major: multiples.filter(({ mantissa }) => mantissa === 1).map(({ value }) => value),
    minor: multiples.filter(({ mantissa }) => mantissa !== 1).map(({ value }) => value),
    titleUnit: '',
  }
}
