import { describe, expect, it } from 'vitest'

import { measureRing } from '@/lib/core/ring/measure-ring'
import type { RingMeasurement } from '@/lib/core/ring/ring-measurement'

import { describedCapture, readCapture, truthOf } from './reference-captures'

function measured(file: string, channel: string): RingMeasurement {
  const capture = readCapture(file)
  const found = capture.channels.find(({ name }) => name === channel)
  if (found === undefined) throw new Error(`No channel ${channel}`)
  const result = measureRing({ ...capture, values: found.values })
  if (!result.ok) throw new Error(result.error.message)
  return result.value
}

const relativeError = (got: number | undefined, expected: number | null): number =>
  got === undefined || expected === null ? Infinity : Math.abs(got / expected - 1)

const ringing = [
  { file: 'o01_bare.csv', channel: 'SW' },
  { file: 'o02_with_cadd_470pF.csv', channel: 'SW' },
  { file: 'o04_semicolon_us_mV.csv', channel: 'Kanal 1' },
  { file: 'o05_four_channels.csv', channel: 'SW', truth: 'SW' },
  { file: 'o06_falling_tab.tsv', channel: 'v_sw' },
  { file: 'o10_rounded_time.csv', channel: 'volts' },
  { file: 'o11_clipped.csv', channel: 'Voltage' },
]

const notRinging = [
  { file: 'o03_snubbed.csv', channel: 'SW' },
  { file: 'o05_four_channels.csv', channel: 'GATE', truth: 'GATE' },
  { file: 'o12_first_order.csv', channel: 'u' },
]

describe('edges against the exact response of the circuit (poles and residues, sampled with ngspice)', () => {
  for (const { file, channel, truth: name } of [...ringing, ...notRinging]) {
    const description = describedCapture(file)
    const truth = truthOf(description, name)
    it(`measures levels, transition and overshoot of ${file} ${channel} (${description.origin})`, () => {
      const { edge, levels, ...rest } = measured(file, channel)
      const height = Math.abs((truth.top_level ?? 5) - (truth.base_level ?? 0))
      expect(edge.direction).toBe(truth.edge)
      expect(Math.abs(levels.base - (truth.base_level ?? 0))).toBeLessThan(0.005 * height)
      expect(Math.abs(levels.top - (truth.top_level ?? 5))).toBeLessThan(0.005 * height)
      expect(relativeError(edge.transitionSeconds, truth.rise_time_10_90)).toBeLessThan(
        description.tolerance.rise_time_rel,
      )
      if (rest.overshootIsLowerBound) {
        expect(rest.overshootFraction).toBeLessThan(truth.overshoot_fraction)
      } else {
        const off = Math.abs(rest.overshootFraction - truth.overshoot_fraction)
        expect(off).toBeLessThan(description.tolerance.overshoot_abs)
      }
    })
  }
})

describe('ringing against the least-damped pole pair of the circuit', () => {
  for (const { file, channel, truth: name } of ringing) {
    const description = describedCapture(file)
    const { tolerance } = description
    const truth = truthOf(description, name)
    it(`measures the ring of ${file} ${channel} (${description.origin})`, () => {
      const { ring } = measured(file, channel)
      expect(relativeError(ring?.dampedFrequency, truth.ring_frequency)).toBeLessThan(
        tolerance.ring_frequency_rel,
      )
      expect(relativeError(ring?.naturalFrequency, truth.natural_frequency)).toBeLessThan(
        tolerance.ring_frequency_rel,
      )
      expect(relativeError(ring?.dampingRatio, truth.damping_ratio)).toBeLessThan(tolerance.damping_ratio_rel)
      expect(ring?.confidence).toBe('high')
    })
  }

  for (const { file, channel } of notRinging) {
    it(`finds no ring in ${file} ${channel} and says why`, () => {
      const { ring, ringAbsence } = measured(file, channel)
      expect(ring).toBeNull()
      expect(ringAbsence).toMatch(/above the noise after the edge/u)
    })
  }

  it('flags a peak that the vertical range cuts off, and only that one', () => {
    expect(measured('o11_clipped.csv', 'Voltage')).toMatchObject({
      overshootIsLowerBound: true,
      warnings: [expect.stringContaining('cut off by the vertical range')],
    })
    for (const { file, channel } of [...ringing, ...notRinging]) {
      if (file !== 'o11_clipped.csv') expect(measured(file, channel).warnings, file).toEqual([])
    }
  })

  it('finds no edge in a supply rail with noise only', () => {
    const capture = readCapture('o05_four_channels.csv')
    const rail = capture.channels.find(({ name }) => name === 'VIN')
    expect(measureRing({ ...capture, values: rail?.values ?? new Float64Array() })).toMatchObject({
      ok: false,
      error: { code: 'no_edge' },
    })
  })
})
