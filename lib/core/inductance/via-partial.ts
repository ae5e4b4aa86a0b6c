import { vacuumPermeability } from '../physics/constants'
import { alignedFilaments } from './parallel-filaments'

const perTwoPi = vacuumPermeability / (2 * Math.PI)

/**
 * The flux of a filament on the axis of a via, outside its barrel, henries: L = (µ₀/2π) [h asinh(h/r) − √(h² + r²) + r].
 * Goes over into the same “ln(4h/d) − 1” as the exact tube. Source: E. B. Rosa 1908 (from memory).
 */
export const viaFluxToSurface = alignedFilaments

/**
 * The popular 5.08 h [ln(4h/d) + 1], h in inches, as SI, henries: (µ₀ h/2π)(ln(4h/d) + 1). No partial inductance of any
 * current: the derivation gives −1 in place of +1, so that it is high by µ₀ h/π, 10 nH an inch. For comparison only.
 */
export const viaPopular = (length: number, diameter: number): number =>
  perTwoPi * length * (Math.log((4 * length) / diameter) + 1)

/**
 * A fit for a via to ground in microstrip, henries: (µ₀/2π) [h ln((h + √(r² + h²))/r) + (3/2)(r − √(r² + h²))].
 * Source: M. E. Goldfarb, R. A. Pucel, IEEE Microwave and Guided Wave Letters 1 (1991) no. 6 (from memory).
 */
export const viaMicrostripFit = (length: number, radius: number): number =>
  perTwoPi * (length * Math.asinh(length / radius) + 1.5 * (radius - Math.hypot(radius, length)))
