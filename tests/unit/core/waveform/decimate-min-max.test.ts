import fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import { decimateMinMax } from '@/lib/core/waveform/decimate-min-max'

describe('decimateMinMax', () => {
  it('keeps every extreme, however few the columns', () => {
    const samples = fc.array(fc.double({ noNaN: true }), { minLength: 1, maxLength: 300 })
    fc.assert(
      fc.property(samples, fc.integer({ min: 1, max: 400 }), (list, buckets) => {
        const { x, min, max } = decimateMinMax(Float64Array.from(list), 0, 1, 0, list.length - 1, buckets)
        expect(x).toHaveLength(Math.min(buckets, list.length))
        expect(Math.min(...min)).toBe(Math.min(...list))
        expect(Math.max(...max)).toBe(Math.max(...list))
      }),
    )
  })

  it('gives the samples themselves where there are columns enough, with one more at each side', () => {
    const values = Float64Array.of(0, 1, 4, 9, 16, 25)
    const trace = decimateMinMax(values, 10, 2, 14, 16, 100)
    expect(trace).toEqual({ x: [12, 14, 16, 18], min: [1, 4, 9, 16], max: [1, 4, 9, 16] })
  })

  it('is empty outside of the record', () => {
    expect(decimateMinMax(Float64Array.of(1, 2), 0, 1, 9, 12, 5)).toEqual({ x: [], min: [], max: [] })
  })
})
