import { describe, expect, it } from 'vitest'

import { measureRing } from '@/lib/core/ring/measure-ring'
import { ringFigure } from '@/lib/core/ring/ring-figure'

import { composedEdge, ringingEdge } from './ringing-edge'

function figureOf(edge: typeof composedEdge) {
  const trace = ringingEdge(edge)
  const result = measureRing(trace)
  if (!result.ok) throw new Error(result.error.message)
  return { figure: ringFigure(result.value, trace, 'V'), trace }
}

describe('ringFigure', () => {
  it('shows the measured trace, the fitted ring over it, the levels and the frequency', () => {
    const { figure } = figureOf(composedEdge)
    expect(figure.series.map(({ role }) => role)).toEqual(['measured', 'computed'])
    expect(figure.marks.map(({ label }) => label)).toEqual([
      'base',
      'top',
      expect.stringMatching(/^50\.\d\d\u00a0MHz, ζ = 0\.03\d\d$/u),
    ])
    expect(figure.description).toContain('rings at 50.')
  })

  it('draws the fitted ring where the samples are', () => {
    const { figure, trace } = figureOf({ ...composedEdge, noise: 0, step: 0 })
    const fitted = figure.series[1]
    const off = fitted?.x.map((instant, index) => {
      const sample = Math.round((instant - trace.startSeconds) / trace.intervalSeconds)
      return Math.abs((fitted.y[index] ?? NaN) - (trace.values[sample] ?? NaN))
    })
    // Half a sample at the steepest place of a 6 V ring of 50 MHz is 0.24 V.
    expect(Math.max(...(off ?? [Infinity]))).toBeLessThan(0.3)
  })

  it('stays within 1200 points and shows an edge without a ring', () => {
    for (const edge of [
      composedEdge,
      { ...composedEdge, frequency: 2e6, seconds: 20e-6 },
      { ...composedEdge, overshoot: 0 },
    ]) {
      const { figure } = figureOf(edge)
      const points = figure.series.reduce((sum, { x }) => sum + x.length, 0)
      expect(points).toBeGreaterThan(50)
      expect(points).toBeLessThanOrEqual(1200)
    }
    expect(figureOf({ ...composedEdge, overshoot: 0 }).figure.title).toBe('Edge')
  })
})
