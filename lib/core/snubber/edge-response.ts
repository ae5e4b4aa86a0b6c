import { add, complex, divide, exponentialMean, multiply, scale, type Complex } from '../linear/complex'
import { valueAt, type Polynomial } from '../linear/polynomial'
import { rootsOf } from '../linear/roots'
import { separate } from '../linear/separate'

/** One exponential of a response, c·exp(p t). */
export type Mode = { readonly pole: Complex; readonly weight: Complex }

/** offset + slope·t + Σ c exp(p t), t from the beginning of the stretch. */
export type Stretch = { readonly offset: number; readonly slope: number; readonly modes: readonly Mode[] }

/**
 * The response of a linear network to a source that rises from 0 to 1 on a straight line of duration `edge` and stays:
 * one stretch on the edge, one from its end on. Normalised time.
 */
export type EdgeResponse = { readonly edge: number; readonly onEdge: Stretch; readonly after: Stretch }

const nothing: Stretch = { offset: 0, slope: 0, modes: [] }

/**
 * Partial fractions of N(s)/(s D(s)) give the step response a0 + Σ R exp(p t) with R = N(p)/(p D′(p)); its running mean
 * over the edge is the ramp response. An edge of 0 is the ideal step. Exact to rounding, but for coinciding poles, which
 * `separate` moves apart.
 */
export function edgeResponse(
  numerator: Polynomial,
  denominator: Polynomial,
  edge: number,
  roots: readonly Complex[] = rootsOf(denominator),
): EdgeResponse {
  const final = (numerator[0] ?? 0) / (denominator[0] ?? 1)
  const poles = separate(roots)
  const leading = denominator.at(-1) ?? 1
  const step = poles.map((pole) => ({
    pole,
    weight: divide(valueAt(numerator, pole), multiply(pole, slopeAt(pole, poles, leading))),
  }))
  const modes = step.map(({ pole, weight }) => ({
    pole,
    weight: multiply(weight, exponentialMean(scale(pole, edge))),
  }))
  const after: Stretch = { offset: final, slope: 0, modes }
  if (edge === 0) return { edge, onEdge: nothing, after }
  const onEdge = step.map(({ pole, weight }) => ({ pole, weight: divide(weight, scale(pole, edge)) }))
  const offset = -onEdge.reduce((sum, mode) => sum + mode.weight.re, 0)
  return { edge, onEdge: { offset, slope: final / edge, modes: onEdge }, after }
}

/** D′ at a pole: the leading coefficient times the distances to the other poles. */
function slopeAt(pole: Complex, poles: readonly Complex[], leading: number): Complex {
  return poles
    .filter((other) => other !== pole)
    .reduce((product, other) => multiply(product, add(pole, scale(other, -1))), complex(leading))
}

/** The response at a normalised time; 0 before the edge begins. */
export function valueOf(response: EdgeResponse, time: number): number {
  if (time < 0) return 0
  const { edge, onEdge, after } = response
  return time < edge ? valueIn(onEdge, time) : valueIn(after, time - edge)
}

/** The value of a stretch in its own time. Of a conjugate pair one mode is taken twice. */
export function valueIn({ offset, slope, modes }: Stretch, time: number): number {
  let sum = offset + slope * time
  for (const { pole, weight } of modes) {
    if (pole.im < 0) continue
    const size = Math.exp(pole.re * time)
    if (pole.im === 0) sum += weight.re * size
    else sum += 2 * size * (weight.re * Math.cos(pole.im * time) - weight.im * Math.sin(pole.im * time))
  }
  return sum
}

/** The rate of change of a stretch. */
export const derivativeOf = ({ slope, modes }: Stretch): Stretch => ({
  offset: slope,
  slope: 0,
  modes: modes.map(({ pole, weight }) => ({ pole, weight: multiply(pole, weight) })),
})

/** ∫ of the squared response from the beginning of the edge to infinity; the final value must be 0. */
export function squareIntegral(response: EdgeResponse): number {
  const { edge, onEdge, after } = response
  // A current through capacitors has no slope on the edge: an offset and exponentials only.
  const constant: Mode = { pole: complex(0), weight: complex(onEdge.offset) }
  const during = productIntegral([constant, ...onEdge.modes], edge)
  return during + productIntegral(after.modes, Infinity)
}

function productIntegral(modes: readonly Mode[], duration: number): number {
  if (duration === 0) return 0
  let sum = 0
  for (const a of modes) {
    for (const b of modes) {
      const pole = complex(a.pole.re + b.pole.re, a.pole.im + b.pole.im)
      const weight = multiply(a.weight, b.weight)
      const span =
        duration === Infinity
          ? divide(complex(-1), pole)
          : scale(exponentialMean(scale(pole, duration)), duration)
      sum += multiply(weight, span).re
    }
  }
  return sum
}
