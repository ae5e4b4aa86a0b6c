import { medianOf } from './median'

/** Edges that keep their places within this part of a period repeat. */
const mostJitter = 0.02

/** Instants of like edges, every `stride`-th of them. */
export type EdgeTrain = {
  readonly rising: readonly number[]
  readonly falling: readonly number[]
  readonly stride: number
}

export type FoundPeriod = {
  readonly period: number
  readonly jitter: number
  /** Part of the period from a rising edge to the next falling one. */
  readonly duty: number
  readonly periods: number
}

type Places = { readonly instants: readonly number[]; readonly orders: readonly number[] }

/**
 * The period of a train of edges, t = t₀ + kT by least squares over rising and falling edges together, with a t₀ of their
 * own; duty from the two t₀. In the unit of the instants. Null where edges are too few (two intervals between like edges
 * are needed) or lie more than 2 % of a period (rms) off their places.
 */
export function findPeriod({ rising, falling, stride }: EdgeTrain): FoundPeriod | null {
  const intervals = [...intervalsOf(rising), ...intervalsOf(falling)]
  if (intervals.length < 2 || rising.length === 0 || falling.length === 0) return null
  const typical = medianOf(intervals)
  const groups = [rising, falling].map((instants) => placesOf(instants, typical, stride))
  const period = slopeOf(groups)
  if (!(period > 0)) return null
  const [up = 0, down = 0] = groups.map((group) => offsetOf(group, period))
  const jitter = Math.sqrt(
    (squareOff(groups[0], up, period) + squareOff(groups[1], down, period)) /
      (rising.length + falling.length),
  )
  if (jitter > mostJitter * period) return null
  const turn = (down - up) / period
  const spans = groups.map(({ orders }) => orders.at(-1) ?? 0)
  return { period, jitter, duty: turn - Math.floor(turn), periods: Math.max(...spans) }
}

const intervalsOf = (instants: readonly number[]): readonly number[] =>
  instants.slice(1).map((instant, index) => instant - (instants[index] ?? 0))

/** Numbers the edges by their periods, so that one that was not seen leaves a gap. */
function placesOf(instants: readonly number[], typical: number, stride: number): Places {
  let order = 0
  const orders = instants.map((instant, index) => {
    const before = instants[index - 1]
    if (before !== undefined) order += stride * Math.max(1, Math.round((instant - before) / typical))
    return order
  })
  return { instants, orders }
}

const meanOf = (numbers: readonly number[]): number =>
  numbers.reduce((sum, value) => sum + value, 0) / numbers.length

function slopeOf(groups: readonly Places[]): number {
  let moment = 0
  let spread = 0
  for (const { instants, orders } of groups) {
    const middle = meanOf(orders)
    const instant = meanOf(instants)
    orders.forEach((order, index) => {
      moment += (order - middle) * ((instants[index] ?? 0) - instant)
      spread += (order - middle) ** 2
    })
  }
  return moment / spread
}

const offsetOf = ({ instants, orders }: Places, period: number): number =>
  meanOf(instants) - period * meanOf(orders)

const squareOff = (places: Places | undefined, offset: number, period: number): number =>
  places?.instants.reduce(
    (sum, instant, index) => sum + (instant - offset - period * (places.orders[index] ?? 0)) ** 2,
    0,
  ) ?? 0
