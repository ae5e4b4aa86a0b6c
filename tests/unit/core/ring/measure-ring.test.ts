import { describe, expect, it } from 'vitest'

import { measureRing, type RingInput } from '@/lib/core/ring/measure-ring'
import type { Trace } from '@/lib/core/ring/ring-measurement'

import { composedEdge, noiseFrom, ringingEdge } from './ringing-edge'

function measured(input: RingInput) {
  const result = measureRing(input)
  if (!result.ok) throw new Error(result.error.message)
  return result.value
}

const relativeError = (got: number | undefined, expected: number) =>
  Math.abs((got ?? Infinity) / expected - 1)

const joined = (first: Trace, second: Trace): Trace => ({
  ...first,
  values: Float64Array.of(...first.values, ...second.values),
})

describe('measureRing on edges composed from numbers', () => {
  const cases = [
    { name: 'a rising edge', edge: composedEdge },
    { name: 'a falling edge', edge: { ...composedEdge, base: 10, top: 0 } },
    { name: 'negative levels', edge: { ...composedEdge, base: -30, top: -20 } },
    { name: 'strong damping', edge: { ...composedEdge, dampingRatio: 0.12 } },
    { name: 'no noise and no steps', edge: { ...composedEdge, noise: 0, step: 0 } },
    { name: 'coarse steps', edge: { ...composedEdge, step: 0.4, noise: 0.1 } },
    { name: 'strong noise', edge: { ...composedEdge, noise: 0.15 } },
  ]
  it.each(cases)('measures $name', ({ edge }) => {
    const { ring, levels, ...rest } = measured(ringingEdge(edge))
    expect(Math.abs(levels.base - edge.base)).toBeLessThan(0.1)
    expect(Math.abs(levels.top - edge.top)).toBeLessThan(0.1)
    expect(Math.abs(rest.overshootFraction - edge.overshoot)).toBeLessThan(0.05)
    expect(relativeError(ring?.dampedFrequency, edge.frequency)).toBeLessThan(0.01)
    expect(relativeError(ring?.dampingRatio, edge.dampingRatio)).toBeLessThan(0.1)
    expect(rest.warnings).toEqual([])
  })

  it('relates frequency, damping ratio, decrement and quality by the textbook formulas', () => {
    const { ring } = measured(ringingEdge({ ...composedEdge, dampingRatio: 0.12 }))
    const zeta = ring?.dampingRatio ?? NaN
    const root = Math.sqrt(1 - zeta ** 2)
    expect((ring?.dampedFrequency ?? NaN) / root / (ring?.naturalFrequency ?? NaN)).toBeCloseTo(1, 12)
    expect(ring?.logDecrement).toBeCloseTo((2 * Math.PI * zeta) / root, 12)
    expect(ring?.qualityFactor).toBeCloseTo(1 / (2 * zeta), 12)
  })

  it('takes the top from the fit where the ring has not died away, and says so', () => {
    const edge = { ...composedEdge, dampingRatio: 0.005, seconds: 200e-9 }
    const { levels, ring, warnings } = measured(ringingEdge(edge))
    expect(Math.abs(levels.top - 10)).toBeLessThan(0.05)
    expect(relativeError(ring?.dampingRatio, 0.005)).toBeLessThan(0.1)
    expect(warnings).toEqual([expect.stringContaining('not died away')])
  })

  it('ends the ring at the next edge and measures the edge of the chosen window', () => {
    const rising = ringingEdge(composedEdge)
    const pulse = joined(rising, ringingEdge({ ...composedEdge, base: 10, top: 0, frequency: 40e6 }))
    expect(relativeError(measured(pulse).ring?.dampedFrequency, 50e6)).toBeLessThan(0.01)
    const second = measured({ ...pulse, from: 0.7e-6 })
    expect(second.edge.direction).toBe('falling')
    expect(second.edge.instantSeconds).toBeCloseTo(1.4e-6, 8)
    expect(relativeError(second.ring?.dampedFrequency, 40e6)).toBeLessThan(0.01)
  })

  it('finds no ring that does not decay, and says why', () => {
    const { ring, ringAbsence } = measured(
      ringingEdge({ ...composedEdge, dampingRatio: -0.001, overshoot: 0.2 }),
    )
    expect(ring).toBeNull()
    expect(ringAbsence).toContain('does not decay')
  })

  it('survives being stored as JSON', () => {
    const measurement = measured(ringingEdge(composedEdge))
    expect(JSON.parse(JSON.stringify(measurement))).toEqual(measurement)
  })
})

describe('what measureRing refuses', () => {
  const random = noiseFrom(7)
  const trace = (values: Float64Array) => ({ values, startSeconds: 0, intervalSeconds: 1e-9 })
  it.each([
    ['no samples', trace(new Float64Array()), 'too_few_samples'],
    ['a window beside the record', { ...ringingEdge(composedEdge), from: 1, to: 2 }, 'too_few_samples'],
    [
      'a window that ends before it begins',
      { ...ringingEdge(composedEdge), from: 0, to: -1 },
      'too_few_samples',
    ],
    ['a constant', trace(new Float64Array(1000).fill(3)), 'no_edge'],
    ['noise', trace(Float64Array.from({ length: 5000 }, random)), 'no_edge'],
    ['a window before the edge', { ...ringingEdge(composedEdge), to: -10e-9 }, 'no_edge'],
  ])('refuses %s', (_, input, code) => {
    expect(measureRing(input)).toMatchObject({ ok: false, error: { code } })
  })
})
