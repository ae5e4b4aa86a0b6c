import { describe, expect, it } from 'vitest'

import { randomSource, xoshiro128 } from '@/lib/core/uncertainty/random'

const many = 100_000

const moments = (draw: () => number) => {
  const values = Array.from({ length: many }, draw)
  const mean = values.reduce((sum, value) => sum + value, 0) / many
  const variance = values.reduce((sum, value) => sum + (value - mean) ** 2, 0) / many
  return { mean, variance, values }
}

describe('the random source', () => {
  // Source: the algorithm as published, run with Python integers.
  it('is xoshiro128**', () => {
    const next = xoshiro128([1, 2, 3, 4])
    expect(Array.from({ length: 8 }, next)).toEqual([
      11520, 0, 5927040, 70819200, 2031721883, 1637235492, 1287239034, 3734860849,
    ])
  })

  it('repeats itself for a seed and differs for another', () => {
    const first = Array.from({ length: 5 }, randomSource(7).uniform)
    expect(Array.from({ length: 5 }, randomSource(7).uniform)).toEqual(first)
    expect(Array.from({ length: 5 }, randomSource(8).uniform)).not.toEqual(first)
  })

  it('draws evenly between 0 and 1', () => {
    const { mean, variance, values } = moments(randomSource(1).uniform)
    expect(Math.abs(mean - 0.5)).toBeLessThan(0.004)
    expect(Math.abs(variance - 1 / 12)).toBeLessThan(0.002)
    expect(values.every((value) => value >= 0 && value < 1)).toBe(true)
    expect(values.filter((value) => value < 0.1).length / many).toBeCloseTo(0.1, 2)
  })

  it('draws from the standard normal distribution', () => {
    const { mean, variance, values } = moments(randomSource(2).normal)
    expect(Math.abs(mean)).toBeLessThan(0.015)
    expect(Math.abs(variance - 1)).toBeLessThan(0.03)
    expect(values.filter((value) => Math.abs(value) < 1.959964).length / many).toBeCloseTo(0.95, 2)
  })
})
