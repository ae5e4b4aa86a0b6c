import fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import { columnsOfOverview, overviewOf, samplesPerEntry } from '@/lib/core/waveform/overview'

describe('the overview of a record', () => {
  it('keeps every extreme, however few the columns', () => {
    const lengths = fc.integer({ min: 1, max: 5 * samplesPerEntry + 7 })
    fc.assert(
      fc.property(lengths, fc.integer({ min: 1, max: 9 }), fc.integer(), (length, columns, seed) => {
        const values = Float64Array.from({ length }, (_, index) => Math.sin(seed + index * index))
        const { x, min, max } = columnsOfOverview(overviewOf(values), columns)
        expect(Math.min(...min)).toBe(Math.min(...values))
        expect(Math.max(...max)).toBe(Math.max(...values))
        expect(x).toHaveLength(Math.min(columns, Math.ceil(length / samplesPerEntry)))
      }),
      { numRuns: 60 },
    )
  })

  it('places a column at the middle of its samples', () => {
    const { x } = columnsOfOverview(overviewOf(new Float64Array(4 * samplesPerEntry)), 2)
    expect(x).toEqual([255.5, 767.5])
  })
})
