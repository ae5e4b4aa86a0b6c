import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import { candidatesOf, clashesOf, type CombSource } from '@/lib/core/spectrum/comb'
import { bandsAt, mixingProducts } from '@/lib/core/spectrum/intermodulation'

const sw1 = { name: 'sw1', frequency: 380e3 }
const sw2 = { name: 'sw2', frequency: 410e3 }
const tolerance = { ppm: 200, hertz: 1000 }

const named = (peak: number, sources: readonly CombSource[]) =>
  candidatesOf(peak, sources, tolerance).map(({ source, harmonic }) => `${source.name} ${harmonic}`)

describe('the sources of a peak', () => {
  it('are all named: one, several, or none', () => {
    expect(named(3_799_490, [sw1, sw2])).toEqual(['sw1 10'])
    expect(named(15_582_112, [sw1, sw2])).toEqual(['sw1 41', 'sw2 38'])
    expect(named(995_000, [sw1, sw2])).toEqual([])
  })

  it('are those that trying every harmonic gives', () => {
    const frequency = fc.double({ min: 1e4, max: 1e7, noNaN: true })
    fc.assert(
      fc.property(
        fc.double({ min: 1e4, max: 1e9, noNaN: true }),
        fc.array(frequency, { minLength: 1, maxLength: 4 }),
        fc.double({ min: 0, max: 5000, noNaN: true }),
        fc.double({ min: 0, max: 5000, noNaN: true }),
        (peak, frequencies, ppm, hertz) => {
          const sources = frequencies.map((f, index) => ({ name: `${index}`, frequency: f }))
          const tried = sources.flatMap(({ name, frequency: f }) => {
            const hits: string[] = []
            for (let h = 1; h * f < 1.1 * peak + f + hertz; h += 1) {
              if (Math.abs(peak - h * f) <= h * f * ppm * 1e-6 + hertz) hits.push(`${name} ${h}`)
            }
            return hits
          })
          const found = candidatesOf(peak, sources, { ppm, hertz })
          expect(found.map(({ source, harmonic }) => `${source.name} ${harmonic}`)).toEqual(tried)
        },
      ),
      { numRuns: 50 },
    )
  })

  it('cannot be told apart where h|f₁ − f₂| is no more than twice the tolerance', () => {
    const near = [
      { name: 'a', frequency: 500e3 },
      { name: 'b', frequency: 500.1e3 },
    ]
    // Ten harmonics up they are 1 kHz apart, twenty-one up 2.1 kHz.
    const at = (peak: number) =>
      clashesOf(candidatesOf(peak, near, { ppm: 0, hertz: 1000 }), { ppm: 0, hertz: 1000 })
    expect(at(5.0005e6)).toMatchObject([{ spacing: 1000, needed: 2000 }])
    expect(at(10.50105e6)).toEqual([])
  })

  it('are found for 20 000 peaks and 20 sources within a second', () => {
    const sources = Array.from({ length: 20 }, (_, index) => ({
      name: `${index}`,
      frequency: 1e5 + 7919 * index,
    }))
    const start = performance.now()
    let count = 0
    for (let index = 0; index < 20_000; index += 1) {
      count += candidatesOf(150e3 + 1500.7 * index, sources, tolerance).length
    }
    expect(count).toBeGreaterThan(0)
    expect(performance.now() - start).toBeLessThan(1000)
  })
})

describe('mixing products', () => {
  it('of third order from 10 and 11 MHz', () => {
    const products = mixingProducts(10e6, 11e6, 3, 8e6, 13e6)
    expect(products).toEqual([
      { frequency: 9e6, order: 3, m: 2, n: -1 },
      { frequency: 10e6, order: 1, m: 1, n: 0 },
      { frequency: 11e6, order: 1, m: 0, n: 1 },
      { frequency: 12e6, order: 3, m: -1, n: 2 },
    ])
  })

  it('are as many as there are pairs of whole numbers, up to order 7', () => {
    // 2 N (N + 1) pairs, of which one of each two opposite ones has a frequency above 0.
    expect(mixingProducts(1e6, Math.PI * 1e6, 7, 0, 1e9)).toHaveLength(7 * 8)
  })

  it('land in the bands that hold them, edges included', () => {
    const bands = [
      { name: 'VHF air', from: 118e6, to: 137e6 },
      { name: 'upper half', from: 130e6, to: 137e6 },
    ]
    expect(bandsAt(118e6, bands).map(({ name }) => name)).toEqual(['VHF air'])
    expect(bandsAt(137e6, bands)).toHaveLength(2)
    expect(bandsAt(117.9e6, bands)).toEqual([])
  })
})
