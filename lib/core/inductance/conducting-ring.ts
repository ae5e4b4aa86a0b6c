import { completeE, completeK } from '../elliptic/complete-integrals'
import { vacuumPermeability } from '../physics/constants'

/** The thickest wire, r/a, whose series is summed: beyond it the hole of the ring is as good as closed. */
export const thickestRing = 1 - 1e-6

/**
 * Inductance of a perfectly conducting ring of round wire, henries: exact for any r/a up to 1 − 10⁻⁶.
 *
 * In toroidal coordinates, cosh η = a/r on the surface and c = √(a² − r²), the flux function is
 * c sinh η (cosh η − cos θ)^(−½) Σ cₙ P¹ₙ₋½(cosh η) cos nθ. It is constant on the surface, which gives the cₙ from the
 * Fourier series Σ bₙ e^(inθ) of √(cosh η − cos θ); the circulation of the field around the wire is the current:
 *
 *     L = 2π µ₀ c / { 2π coth² η − π + (2π/sinh η) [b₀² ρ₀ + 2 Σ bₙ² ρₙ] },   ρₙ = d ln P¹ₙ₋½ / dη
 *
 * Derived here; the coordinates after V. Fock, Physikalische Zeitschrift der Sowjetunion 1 (1932) 215 (from memory).
 */
export function conductingRing(radius: number, wireRadius: number): number {
  const x = radius / wireRadius
  const sinh = Math.sqrt((x - 1) * (x + 1))
  const size = wireRadius * sinh
  const count = Math.ceil(20 / Math.acosh(x)) + 4
  const series = rootSeries(x, count)
  const slopes = logarithmicSlopes(x, sinh, count)
  const sum = series.reduce((total, b, n) => total + (n === 0 ? 1 : 2) * b * b * (slopes[n] ?? 0), 0)
  const circulation = 2 * Math.PI * (x / sinh) ** 2 - Math.PI + (2 * Math.PI * sum) / sinh
  return (2 * Math.PI * vacuumPermeability * size) / circulation
}

/** bₙ of √(x − cos θ) = Σ bₙ e^(inθ), n = 0…count − 1, by the backward recurrence, which is the stable one. */
function rootSeries(x: number, count: number): readonly number[] {
  const values = Array<number>(count + 12).fill(0)
  values[count + 10] = 1e-290
  for (let n = count + 10; n >= 1; n -= 1) {
    const lower = 2 * x * n * (values[n] ?? 0) - (n + 1.5) * (values[n + 1] ?? 0)
    values[n - 1] = lower / (n - 1.5)
  }
  const first = (2 / Math.PI) * Math.sqrt(x + 1) * completeE(Math.sqrt(2 / (x + 1)))
  const scale = first / (values[0] ?? 1)
  return values.slice(0, count).map((value) => value * scale)
}

/** d ln P¹ₙ₋½(cosh η)/dη, n = 0…count − 1, from ratios of neighbours by the forward recurrence. */
function logarithmicSlopes(x: number, sinh: number, count: number): readonly number[] {
  let ratio = firstRatio(x, sinh)
  const slopes = [(-x / 2 - ratio / 2) / sinh]
  for (let n = 1; n < count; n += 1) {
    slopes.push(((n - 0.5) * x - (n + 0.5) / ratio) / sinh)
    ratio = (2 * n * x - (n + 0.5) / ratio) / (n - 0.5)
  }
  return slopes
}

/** P¹₊½ / P¹₋½ by complete elliptic integrals of the modulus tanh(η/2). */
function firstRatio(x: number, sinh: number): number {
  const [modulus, complement] = [Math.sqrt((x - 1) / (x + 1)), Math.sqrt(2 / (x + 1))]
  const first = completeK(modulus, complement)
  const second = completeE(modulus, complement)
  const minusHalf = (2 / Math.PI) * complement * first
  const minusHalfSlope = (complement * (second - first)) / (Math.PI * modulus)
  const plusHalf = 2 * sinh * minusHalfSlope + x * minusHalf
  return (x * plusHalf - minusHalf) / (2 * sinh) / minusHalfSlope
}
