import { add, complex, divide, exponential, magnitude, multiply, scale } from '../linear/complex'
import { freeSpaceImpedance, vacuumPermeability } from '../physics/constants'

/** A sheet of a good conductor; SI units, `permeability` relative. */
export type Sheet = {
  readonly conductivity: number
  readonly permeability: number
  readonly thickness: number
}

/** δ = 1/√(π f µ σ), in metres. A good conductor: σ far above ω ε. */
export const skinDepth = (frequency: number, { conductivity, permeability }: Sheet): number =>
  1 / Math.sqrt(Math.PI * frequency * vacuumPermeability * permeability * conductivity)

/** Decibels by which a sheet weakens a plane wave that meets it at a right angle. */
export type PlaneWaveShielding = {
  readonly absorption: number
  readonly reflection: number
  /** Of the waves that go to and fro inside; negative for a sheet that is thin against δ. */
  readonly multipleReflection: number
}

/**
 *     A = 20 lg(e) t/δ,   R = 20 lg |(η₀ + Z_s)²/(4 η₀ Z_s)|,   B = 20 lg |1 − q² exp(−2(1 + j) t/δ)|
 *     Z_s = (1 + j)/(σδ),   q = (η₀ − Z_s)/(η₀ + Z_s)
 *
 * Their sum is exact for an infinite sheet in the far field.
 */
export function planeWaveShielding(frequency: number, sheet: Sheet): PlaneWaveShielding {
  const depth = skinDepth(frequency, sheet)
  const inside = scale(complex(1, 1), 1 / (sheet.conductivity * depth))
  const outside = complex(freeSpaceImpedance)
  const sum = add(outside, inside)
  const q = divide(add(outside, scale(inside, -1)), sum)
  const roundTrip = exponential(scale(complex(1, 1), (-2 * sheet.thickness) / depth))
  const reflection = divide(multiply(sum, sum), scale(multiply(outside, inside), 4))
  const again = add(complex(1), scale(multiply(multiply(q, q), roundTrip), -1))
  return {
    absorption: decibels(Math.E) * (sheet.thickness / depth),
    reflection: decibels(magnitude(reflection)),
    multipleReflection: decibels(magnitude(again)),
  }
}

const decibels = (ratio: number): number => 20 * Math.log10(ratio)
