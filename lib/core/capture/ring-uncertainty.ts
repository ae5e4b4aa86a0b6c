import type { Ring } from '../ring/ring-measurement'
import { solveLinear } from '../ring/solve-linear'
import type { RingWithTail } from './ring-over-tail'

/** Longer stretches are summed at every n-th sample, which stands for n. */
const mostPoints = 2000

export type RingDeviations = {
  /** Standard deviation of f_d, in Hz. */
  readonly frequency: number
  /** Standard deviation of ζ. */
  readonly dampingRatio: number
}

/** What a fit leaves over, beyond so many times the noise, is no noise but changes with half a cycle. */
const likeNoise = 1.3

/**
 * Standard deviations of the frequency and damping of one fitted ring: the diagonal of s² (JᵀJ)⁻¹, J the derivatives of
 * level + e^(−αt)(a cos ωt + b sin ωt) + c e^(−γt) by its parameters and s the rms of what the fit leaves over. Theory of
 * non-linear least squares; the noise is taken as independent from sample to sample. Null where JᵀJ is singular.
 */
export function ringDeviations(
  { fit, dampedFrequency }: Ring,
  intervalSeconds: number,
  noise: number,
  tail: RingWithTail['tail'] | null,
): RingDeviations | null {
  const count = Math.round((fit.endSeconds - fit.startSeconds) / intervalSeconds) + 1
  const stride = Math.max(1, Math.floor(count / mostPoints))
  const omega = 2 * Math.PI * dampedFrequency * intervalSeconds
  const decay = fit.decayRate * intervalSeconds
  const size = tail === null ? 5 : 7
  const matrix = Array.from({ length: size }, () => new Array<number>(size).fill(0))
  for (let time = 0; time < count; time += stride) {
    const envelope = Math.exp(-decay * time)
    const angle = omega * time + fit.phase
    const swing = fit.amplitude * envelope * Math.cos(angle)
    const quadrature = fit.amplitude * envelope * Math.sin(angle)
    const ofRing = [1, swing / fit.amplitude, quadrature / fit.amplitude, time * swing, time * quadrature]
    addProduct(matrix, [...ofRing, ...ofTail(tail, time * intervalSeconds)])
  }
  const varianceOf = (row: number) => {
    const unit = matrix.map((_, index) => (index === row ? 1 : 0))
    return (solveLinear(matrix, unit)?.[row] ?? NaN) / stride
  }
  const perCycle = 1 / (dampedFrequency * intervalSeconds)
  const dependence = fit.residualRms > likeNoise * noise ? Math.sqrt(Math.max(1, perCycle / 2)) : 1
  const scale = (dependence * fit.residualRms) / intervalSeconds
  const ofDecay = scale * Math.sqrt(varianceOf(3))
  const ofOmega = scale * Math.sqrt(varianceOf(4))
  if (!Number.isFinite(ofDecay + ofOmega)) return null
  const natural = Math.hypot(2 * Math.PI * dampedFrequency, fit.decayRate)
  return { frequency: ofOmega / (2 * Math.PI), dampingRatio: ofDecay / natural }
}

/** Derivatives of c e^(−γt) by c and by γt₀, t₀ being the inverse of γ, which keeps their sizes alike. */
function ofTail(tail: RingWithTail['tail'] | null, time: number): readonly number[] {
  if (tail === null) return []
  const shape = Math.exp(-tail.rate * time)
  return [shape, tail.amplitude * tail.rate * time * shape]
}

function addProduct(matrix: number[][], gradient: readonly number[]): void {
  matrix.forEach((row, index) => {
    for (let column = 0; column < row.length; column += 1) {
      row[column] = (row[column] ?? 0) + (gradient[index] ?? 0) * (gradient[column] ?? 0)
    }
  })
}
