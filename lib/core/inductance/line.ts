import { freeSpaceImpedance, speedOfLight, vacuumPermeability } from '../physics/constants'

/** Two round wires with opposite currents, skin effect and proximity included: L′ = (µ₀/π) acosh(s/2r), H/m. */
export const roundPair = (spacing: number, radius: number): number =>
  (vacuumPermeability / Math.PI) * Math.acosh(spacing / (2 * radius))

/** The same for thin wires, of which each leaves the current of the other in place: L′ = (µ₀/π) ln(s/r), H/m. */
export const roundPairThin = (spacing: number, radius: number): number =>
  (vacuumPermeability / Math.PI) * Math.log(spacing / radius)

/** The same for current spread evenly over both wires: L′ = (µ₀/π)(ln(s/r) + ¼), H/m. */
export const roundPairUniform = (spacing: number, radius: number): number =>
  (vacuumPermeability / Math.PI) * (Math.log(spacing / radius) + 1 / 4)

/** A round wire with its centre at a height over a perfect plane: L′ = (µ₀/2π) acosh(h/r), H/m; half of the pair 2h. */
export const wireOverPlane = (height: number, radius: number): number => roundPair(2 * height, radius) / 2

/** The same for a thin wire: L′ = (µ₀/2π) ln(2h/r), H/m. */
export const wireOverPlaneThin = (height: number, radius: number): number =>
  roundPairThin(2 * height, radius) / 2

/**
 * A thin strip over a perfect plane, L′ = Z₀/c of the line in air, H/m:
 *
 *     Z₀ = (η₀/2π) ln(F/u + √(1 + 4/u²)),   F = 6 + (2π − 6) exp(−(30.666/u)^0.7528),   u = w/h
 *
 * Independent of the dielectric. Within 8e-5 of the exact solution for u up to 100, 2.2e-4 beyond.
 * Source: E. Hammerstad, Ø. Jensen, IEEE MTT-S Digest 1980, pp. 407–409 (from memory).
 */
export function stripOverPlane(width: number, height: number): number {
  const u = width / height
  const f = 6 + (2 * Math.PI - 6) * Math.exp(-((30.666 / u) ** 0.7528))
  const impedance = (freeSpaceImpedance / (2 * Math.PI)) * Math.log(f / u + Math.sqrt(1 + 4 / u ** 2))
  return impedance / speedOfLight
}

/** The limit of a very wide strip, L′ = µ₀ h/w, H/m: 30 % too high still at w/h = 10. */
export const wideStripOverPlane = (width: number, height: number): number =>
  (vacuumPermeability * height) / width
