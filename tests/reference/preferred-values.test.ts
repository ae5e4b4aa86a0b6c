import { describe, expect, it } from 'vitest'
import { z } from 'zod'

import { nearestByRatio, neighboursOf, seriesNames } from '@/lib/core/parts/preferred-values'

import { expectWithin, input, referenceCases } from './reference-cases'

// Source: IEC 60063, table of preferred numbers.
describe('preferred values', () => {
  it.each(referenceCases('parts.e_series'))('$id: $how_computed', (item) => {
    const series = z.enum(seriesNames).parse(item.inputs['series'])
    const value = input(item, 'value')
    // A value of the series is its own neighbour; the case has the next ones.
    const { below, above } = neighboursOf(value, series)
    expectWithin(item, { nearest_ratio: nearestByRatio(value, series), next_up: above, next_down: below })
  })

  it('has as many values in each decade as its name says, and repeats them in every decade', () => {
    for (const series of seriesNames) {
      const values = new Set<number>()
      for (let power = 0; power < 1; power += 0.001) values.add(nearestByRatio(10 ** power * 1.0001, series))
      values.delete(10)
      expect(values.size, series).toBe(Number(series.slice(1)))
    }
    expect(nearestByRatio(4.7e-12, 'E12')).toBe(4.7e-12)
    expect(nearestByRatio(9.76, 'E24')).toBe(10)
    expect(nearestByRatio(9.2e5, 'E192')).toBe(9.2e5)
  })
})
