import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import { completeDifference, completeE, completeK } from '@/lib/core/elliptic/complete-integrals'

// Published values: M. Abramowitz, I. A. Stegun, Handbook of Mathematical Functions, table 17.1 (from memory).
describe('complete elliptic integrals', () => {
  it('have the published values at k² = ½', () => {
    expect(completeK(Math.SQRT1_2)).toBeCloseTo(1.85407467730137, 13)
    expect(completeE(Math.SQRT1_2)).toBeCloseTo(1.35064388104768, 13)
  })

  it('are π/2 at 0, and E is 1 at 1', () => {
    expect(completeK(0)).toBeCloseTo(Math.PI / 2, 15)
    expect(completeE(0)).toBeCloseTo(Math.PI / 2, 15)
    expect(completeE(1)).toBe(1)
    expect(completeK(1 + 2 ** -52, 0)).toBe(Infinity)
    expect(completeK(1, 1e-300)).toBeCloseTo(Math.log(4e300), 9)
  })

  it('fulfil Legendre’s relation: E K′ + E′ K − K K′ = π/2', () => {
    fc.assert(
      fc.property(fc.double({ min: 1e-3, max: 0.999, noNaN: true }), (k) => {
        const other = Math.sqrt((1 - k) * (1 + k))
        const [first, second] = [completeK(k, other), completeE(k, other)]
        const [firstOther, secondOther] = [completeK(other, k), completeE(other, k)]
        expect(second * firstOther + secondOther * first - first * firstOther).toBeCloseTo(Math.PI / 2, 12)
      }),
    )
  })

  it('keep the digits of their difference for a small modulus: π k⁴/32', () => {
    for (const k of [1e-2, 1e-4, 1e-8]) {
      expect(completeDifference(k, Math.sqrt((1 - k) * (1 + k))) / ((Math.PI * k ** 4) / 32)).toBeCloseTo(
        1,
        3,
      )
    }
    const difference = (1 - 0.7 ** 2 / 2) * completeK(0.7) - completeE(0.7)
    expect(completeDifference(0.7, Math.sqrt(0.51))).toBeCloseTo(difference, 14)
  })
})
