/**
 * Preferred numbers of IEC 60063. E24 is a table (eight of its values are not rounded powers of ten); E3 to E12 are
 * every eighth to second of it; E48 to E192 are powers of ten rounded to three digits, with 9.20 for 9.19 in E192.
 */
const e24 = [
  10, 11, 12, 13, 15, 16, 18, 20, 22, 24, 27, 30, 33, 36, 39, 43, 47, 51, 56, 62, 68, 75, 82, 91,
] as const

export const seriesNames = ['E3', 'E6', 'E12', 'E24', 'E48', 'E96', 'E192'] as const

export type SeriesName = (typeof seriesNames)[number]

/** The values of one decade as integers of three digits, 100 to 976. */
export function decadeOf(series: SeriesName): readonly number[] {
  const count = Number(series.slice(1))
  if (count <= 24) return e24.filter((_, index) => index % (24 / count) === 0).map((value) => value * 10)
  return Array.from({ length: count }, (_, index) => {
    const rounded = Math.round(100 * 10 ** (index / count))
    return rounded === 919 ? 920 : rounded
  })
}

/** The two neighbours of a value in its series, as written values; equal when the value is one of the series. */
export function neighboursOf(
  value: number,
  series: SeriesName,
): { readonly below: number; readonly above: number } {
  const decade = Math.floor(Math.log10(value) + 1e-12)
  const candidates = [decade - 1, decade, decade + 1].flatMap((exponent) =>
    decadeOf(series).map((digits) => Number(`${digits}e${exponent - 2}`)),
  )
  const isClose = (a: number) => Math.abs(a / value - 1) < 1e-9
  const below = candidates.filter((candidate) => candidate < value || isClose(candidate)).at(-1)
  const above = candidates.find((candidate) => candidate > value || isClose(candidate))
  if (below === undefined || above === undefined) throw new Error('A positive finite value was expected')
  return { below, above }
}

/** The nearest preferred value by difference, |x − v|: another one than by ratio in a narrow zone, as at 1.049. */
export function nearestByDifference(value: number, series: SeriesName): number {
  const { below, above } = neighboursOf(value, series)
  return value - below <= above - value ? below : above
}

/** The nearest preferred value by ratio, |ln(x/v)|: the rule for parts, because tolerances are relative. */
export function nearestByRatio(value: number, series: SeriesName): number {
  const { below, above } = neighboursOf(value, series)
  return value / below <= above / value ? below : above
}
