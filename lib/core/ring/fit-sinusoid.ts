import { solveLinear } from './solve-linear'

/** y(t) = level + e^(−decay·t) (cosine · cos ωt + sine · sin ωt), t in samples from the first. */
export type DecayingSinusoid = {
  readonly level: number
  readonly cosine: number
  readonly sine: number
  readonly decay: number
  readonly omega: number
}

export type SinusoidFit = {
  readonly model: DecayingSinusoid
  /** Root mean square of what is left over. */
  readonly residualRms: number
  /** The part of the variation about the level that the model explains, 0 to 1. */
  readonly explained: number
}

const mostIterations = 60

/** Longer stretches are read at every n-th sample, still far above twice the frequency. */
const mostSamples = 20_000

type Normal = { matrix: number[][]; right: number[]; square: number; variation: number; count: number }

/**
 * Fits one decaying sinusoid to `values[from … to)` by least squares, from a first guess of decay and angular frequency
 * (per sample). Method: Levenberg–Marquardt (D. W. Marquardt, "An Algorithm for Least-Squares Estimation of Nonlinear
 * Parameters", J. SIAM 11, 1963). Null where the equations have no solution.
 */
export function fitSinusoid(
  values: Float64Array,
  from: number,
  to: number,
  guess: DecayingSinusoid,
): SinusoidFit | null {
  const stride = Math.max(1, Math.min(Math.ceil((to - from) / mostSamples), Math.floor(1 / guess.omega)))
  let model = guess
  let normal = normalEquations(values, from, to, stride, model)
  let damping = 1e-3
  for (let iteration = 0; iteration < mostIterations; iteration += 1) {
    const next = stepFrom(model, normal, damping, guess.omega)
    if (next === null) return null
    const tried = normalEquations(values, from, to, stride, next)
    if (tried.square < normal.square) {
      const gain = (normal.square - tried.square) / normal.square
      model = next
      normal = tried
      damping /= 10
      if (gain < 1e-12) break
    } else {
      damping *= 10
      if (damping > 1e9) break
    }
  }
  const explained = normal.variation === 0 ? 0 : 1 - normal.square / normal.variation
  return { model, residualRms: Math.sqrt(normal.square / normal.count), explained }
}

/** The value of the model at a time in samples. */
export function sinusoidAt(model: DecayingSinusoid, time: number): number {
  const angle = model.omega * time
  const swing = model.cosine * Math.cos(angle) + model.sine * Math.sin(angle)
  return model.level + Math.exp(-model.decay * time) * swing
}

/** JᵀJ and Jᵀr of the five parameters, with the sums of squares of the residuals and of the deviations from the level. */
function normalEquations(
  values: Float64Array,
  from: number,
  to: number,
  stride: number,
  model: DecayingSinusoid,
): Normal {
  const matrix = Array.from({ length: 5 }, () => [0, 0, 0, 0, 0])
  const normal: Normal = { matrix, right: [0, 0, 0, 0, 0], square: 0, variation: 0, count: 0 }
  for (let index = from; index < to; index += stride) {
    const time = index - from
    const envelope = Math.exp(-model.decay * time)
    const cosine = envelope * Math.cos(model.omega * time)
    const sine = envelope * Math.sin(model.omega * time)
    const swing = model.cosine * cosine + model.sine * sine
    const slope = time * (model.sine * cosine - model.cosine * sine)
    accumulate(normal, [1, cosine, sine, -time * swing, slope], (values[index] ?? 0) - model.level, swing)
  }
  return normal
}

function accumulate(normal: Normal, gradient: readonly number[], deviation: number, swing: number): void {
  const residual = deviation - swing
  for (let row = 0; row < gradient.length; row += 1) {
    const target = normal.matrix[row]
    const weight = gradient[row] ?? 0
    if (target === undefined) continue
    for (let column = 0; column < gradient.length; column += 1) {
      target[column] = (target[column] ?? 0) + weight * (gradient[column] ?? 0)
    }
    normal.right[row] = (normal.right[row] ?? 0) + weight * residual
  }
  normal.square += residual * residual
  normal.variation += deviation * deviation
  normal.count += 1
}

/** One damped step; damping multiplies the diagonal, so that the different sizes of the parameters do not matter. */
function stepFrom(
  model: DecayingSinusoid,
  normal: Normal,
  damping: number,
  omega: number,
): DecayingSinusoid | null {
  const damped = normal.matrix.map((row, index) =>
    row.map((entry, column) => (index === column ? entry * (1 + damping) + Number.MIN_VALUE : entry)),
  )
  const step = solveLinear(damped, normal.right)
  if (step === null) return null
  const [level = 0, cosine = 0, sine = 0, decay = 0, turn = 0] = step
  const within = (change: number) => Math.min(omega / 4, Math.max(-omega / 4, change))
  return {
    level: model.level + level,
    cosine: model.cosine + cosine,
    sine: model.sine + sine,
    decay: model.decay + within(decay),
    omega: model.omega + within(turn),
  }
}
