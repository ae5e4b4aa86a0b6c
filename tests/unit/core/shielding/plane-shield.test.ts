import fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import { planeWaveShielding, skinDepth, type Sheet } from '@/lib/core/shielding/plane-shield'

const copper: Sheet = { conductivity: 58e6, permeability: 1, thickness: 35e-6 }
const positive = fc.double({ min: 0.01, max: 100, noNaN: true })

describe('the skin depth', () => {
  // Handbook value for annealed copper (from memory): 66 µm at 1 MHz.
  it('of copper at 1 MHz is 66.1 µm', () => {
    expect(skinDepth(1e6, copper) * 1e6).toBeCloseTo(66.09, 2)
  })

  it('falls with the root of frequency, permeability and conductivity', () => {
    fc.assert(
      fc.property(positive, positive, positive, (f, mu, sigma) => {
        const scaled = { ...copper, permeability: mu, conductivity: 58e6 * sigma }
        expect((skinDepth(1e6 * f, scaled) / skinDepth(1e6, copper)) * Math.sqrt(f * mu * sigma)).toBeCloseTo(
          1,
          12,
        )
      }),
    )
  })
})

describe('the shielding of a sheet', () => {
  it('absorbs 8.686 dB a skin depth, and a thick sheet reflects only once', () => {
    const sheet = { ...copper, thickness: 10 * skinDepth(1e6, copper) }
    const { absorption, multipleReflection } = planeWaveShielding(1e6, sheet)
    expect(absorption).toBeCloseTo(86.859, 3)
    expect(multipleReflection).toBeCloseTo(0, 6)
  })

  // A sheet far thinner than its skin depth is a resistance across the wave: |1 + η₀σt/2|.
  it('is that of its resistance where it is thin', () => {
    const thin = { ...copper, thickness: 1e-7 }
    const { absorption, reflection, multipleReflection } = planeWaveShielding(1e4, thin)
    const expected = 20 * Math.log10(1 + (376.7303 * 58e6 * 1e-7) / 2)
    expect(absorption + reflection + multipleReflection).toBeCloseTo(expected, 3)
  })
})
