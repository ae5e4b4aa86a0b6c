import fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import { nearestIndex, panned, withinWhole, zoomed } from '@/lib/figure/time-window'

const whole = { from: -1e-6, to: 9e-6 }

describe('the view of a record', () => {
  it('halves about its middle', () => {
    const half = zoomed(whole, 0.5, whole)
    expect(half.from).toBeCloseTo(1.5e-6, 12)
    expect(half.to).toBeCloseTo(6.5e-6, 12)
  })

  it('comes back to exactly the whole record', () => {
    expect(zoomed(zoomed(whole, 0.5, whole), 4, whole)).toBe(whole)
  })

  it('stops at the ends without changing its span', () => {
    const start = { from: -1e-6, to: 1e-6 }
    const { from, to } = panned(start, -1, whole)
    expect(from).toBe(start.from)
    expect(to).toBeCloseTo(start.to, 15)
  })

  it('never leaves the record nor shrinks to nothing', () => {
    const instant = fc.double({ min: -1e-3, max: 1e-3, noNaN: true })
    fc.assert(
      fc.property(instant, instant, (a, b) => {
        const window = withinWhole({ from: Math.min(a, b), to: Math.max(a, b) }, whole)
        expect(window.from).toBeGreaterThanOrEqual(whole.from)
        expect(window.to).toBeLessThanOrEqual(whole.to + 1e-18)
        expect(window.to).toBeGreaterThan(window.from)
      }),
    )
  })
})

describe('nearest instant', () => {
  it('agrees with a search through all', () => {
    const values = fc.uniqueArray(fc.integer({ min: 0, max: 1000 }), { minLength: 1, maxLength: 50 })
    fc.assert(
      fc.property(values, fc.integer({ min: -10, max: 1010 }), (unsorted, target) => {
        const sorted = [...unsorted].sort((a, b) => a - b)
        const found = sorted[nearestIndex(sorted, target)] ?? NaN
        const least = Math.min(...sorted.map((value) => Math.abs(value - target)))
        expect(Math.abs(found - target)).toBe(least)
      }),
    )
  })

  it('finds nothing in an empty record', () => {
    expect(nearestIndex([], 1)).toBe(-1)
  })
})
