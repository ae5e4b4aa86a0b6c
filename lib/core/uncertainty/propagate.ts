import { err, ok, type Result } from '../result'
import { coverageInterval, explainedVariance } from './coverage'
import { randomSource, type RandomSource } from './random'
import type { Tolerance } from './tolerance'

/** An input that is not exactly known; draws beyond `isPossible` are drawn again. */
export type UncertainInput = {
  readonly key: string
  readonly value: number
  readonly tolerance: Tolerance
  readonly isPossible: (value: number) => boolean
}

/** The 95 % interval of one result. */
export type ResultInterval = {
  readonly key: string
  readonly low: number
  readonly high: number
  /** The input that spreads the result most, with the part of its variance (0 to 1) that it explains. */
  readonly dominant: { readonly input: string; readonly share: number } | null
}

export type Uncertainty = {
  readonly coverage: number
  readonly draws: number
  readonly seed: number
  readonly intervals: readonly ResultInterval[]
}

/** Enough for the first two digits of an interval's ends. */
export const usualDraws = 10_000

const coverage = 0.95
const usualSeed = 20261201
const mostTries = 1000

type Model<E> = (values: Readonly<Record<string, number>>) => Result<Readonly<Record<string, number>>, E>

/**
 * Propagates the distributions of the inputs through a model by the Monte Carlo method of JCGM 101:2008 (GUM
 * Supplement 1) with 10,000 draws from a fixed seed, so that a repeated run gives the same digits. The inputs are
 * independent of each other.
 *
 * Error: the first failure of the model among the draws, or `null` where no possible value is within a tolerance.
 */
export function propagate<E>(
  inputs: readonly UncertainInput[],
  model: Model<E>,
): Result<Uncertainty, E | null> {
  const source = randomSource(usualSeed)
  const causes = inputs.map(() => new Float64Array(usualDraws))
  const effects = new Map<string, Float64Array>()
  for (let index = 0; index < usualDraws; index += 1) {
    const values: Record<string, number> = {}
    for (const [column, input] of inputs.entries()) {
      const drawn = drawOf(input, source)
      if (drawn === null) return err(null)
      values[input.key] = drawn
      const cause = causes[column]
      if (cause) cause[index] = drawn
    }
    const results = model(values)
    if (!results.ok) return results
    if (index === 0)
      for (const key of Object.keys(results.value)) effects.set(key, new Float64Array(usualDraws))
    for (const [key, effect] of effects) {
      const value = results.value[key]
      // A result that not every draw has, such as the level of a null, has no interval.
      if (value === undefined) effects.delete(key)
      else effect[index] = value
    }
  }
  const intervals = [...effects].map(([key, effect]) => intervalOf(key, effect, inputs, causes))
  return ok({ coverage, draws: usualDraws, seed: usualSeed, intervals })
}

function drawOf({ value, tolerance, isPossible }: UncertainInput, source: RandomSource): number | null {
  for (let attempt = 0; attempt < mostTries; attempt += 1) {
    const deviate = tolerance.distribution === 'normal' ? source.normal() / 2 : 2 * source.uniform() - 1
    const drawn = value + tolerance.halfWidth * deviate
    if (isPossible(drawn)) return drawn
  }
  return null
}

function intervalOf(
  key: string,
  effect: Float64Array,
  inputs: readonly UncertainInput[],
  causes: readonly Float64Array[],
): ResultInterval {
  const shares = inputs.map((input, column) => ({
    input: input.key,
    share: explainedVariance(causes[column] ?? effect, effect),
  }))
  const [most] = shares.sort((a, b) => b.share - a.share)
  const { low, high } = coverageInterval(effect, coverage)
  return { key, low, high, dominant: most !== undefined && most.share > 0 ? most : null }
}
