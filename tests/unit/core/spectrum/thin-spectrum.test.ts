import fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import { thinSpectrum } from '@/lib/core/spectrum/thin-spectrum'

describe('a thinned spectrum', () => {
  it('keeps the strongest line with its own frequency, in rising order', () => {
    const levels = fc.array(fc.double({ min: -100, max: 130, noNaN: true }), {
      minLength: 2,
      maxLength: 3000,
    })
    fc.assert(
      fc.property(levels, fc.integer({ min: 1, max: 500 }), (list, columns) => {
        const lines = list.slice(1)
        const thinned = thinSpectrum(Float64Array.from(list), 2, columns)
        const strongest = lines.indexOf(Math.max(...lines)) + 1
        expect(thinned.levels).toContain(Math.max(...lines))
        expect(Math.max(...thinned.levels)).toBe(list[strongest])
        expect(thinned.frequencies.every((f, i) => i === 0 || f > (thinned.frequencies[i - 1] ?? 0))).toBe(
          true,
        )
        expect(thinned.frequencies.length).toBeLessThanOrEqual(columns + 2)
      }),
    )
  })

  it('gives every line where there are columns enough', () => {
    expect(thinSpectrum(Float64Array.of(9, 1, 2, 3, 4), 10, 5000)).toEqual({
      frequencies: [10, 20, 30, 40],
      levels: [1, 2, 3, 4],
    })
  })
})
