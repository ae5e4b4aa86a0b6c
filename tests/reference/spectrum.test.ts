import { describe, expect, it } from 'vitest'
import { z } from 'zod'

import { levelOfPeak, levelOfPower, levelOfRms, rmsOfLevel } from '@/lib/core/spectrum/level'
import { envelopeAt, envelopeOf, harmonicPeak, type PulseTrain } from '@/lib/core/spectrum/pulse-train'

import { resultsOf } from './method-results'
import { expectWithin, input, referenceCases, type ReferenceCase } from './reference-cases'

const trainOf = (item: ReferenceCase): PulseTrain => ({
  amplitude: input(item, 'amplitude'),
  period: input(item, 'period'),
  width: input(item, 'width_50'),
  rise: input(item, 'rise_0_100'),
  fall: input(item, 'fall_0_100'),
})

const numbers = z.array(z.number())

// Source: the Fourier coefficients, by a second way through numeric integration of the waveform.
describe('harmonics of a pulse train', () => {
  it.each(referenceCases('spectrum.trapezoid'))('$id: $how_computed', (item) => {
    for (const n of numbers.parse(item.inputs['harmonics'])) {
      const peak = harmonicPeak(trainOf(item), n)
      expectWithin(item, {
        [`h${n}_peak`]: peak,
        ...(`h${n}_dbuv` in item.expected ? { [`h${n}_dbuv`]: levelOfPeak(peak) } : {}),
      })
    }
  })
})

describe('the envelope and the rules for a bandwidth', () => {
  it.each(referenceCases('spectrum.envelope'))('$id: $how_computed', (item) => {
    const train = trainOf(item)
    const envelope = envelopeOf(train)
    const { amplitude, period, width, rise, fall } = train
    const result = resultsOf('pulse-train-spectrum', { amplitude, frequency: 1 / period, width, rise, fall })
    expectWithin(item, {
      plateau_peak: result?.('plateau') ?? NaN,
      corner1: result?.('firstCorner') ?? NaN,
      corner2: result?.('secondCorner') ?? NaN,
      bandwidth_0_35_over_tr1090: result?.('bandwidth') ?? NaN,
      bandwidth_knee_0_5_over_tr1090: result?.('knee') ?? NaN,
      bandwidth_1_over_pi_tr: result?.('secondCorner') ?? NaN,
    })
    const levels = Object.keys(item.expected).filter((key) => key.startsWith('env_dbuv_at_'))
    expect(levels.length).toBeGreaterThan(0)
    for (const key of levels) {
      const frequency = Number(key.replace('env_dbuv_at_', ''))
      expectWithin(item, { [key]: levelOfPeak(envelopeAt(envelope, frequency)) })
    }
  })

  it.each(referenceCases('spectrum.envelope'))('no harmonic is above it: $id', (item) => {
    const train = trainOf(item)
    const envelope = envelopeOf(train)
    for (let n = 1; n < 400; n += 1) {
      expect(harmonicPeak(train, n)).toBeLessThanOrEqual(envelopeAt(envelope, n / train.period) * (1 + 1e-12))
    }
  })
})

// Source: the definition of the decibel, in 40-digit arithmetic.
describe('levels in decibels', () => {
  const conversions: Readonly<Record<string, (value: number) => Readonly<Record<string, number>>>> = {
    v_rms_to_dbuv: (value) => ({ dbuv: levelOfRms(value) }),
    dbm_to_dbuv_50ohm: (value) => ({ dbuv: levelOfPower(value), v_rms: rmsOfLevel(levelOfPower(value)) }),
    v_peak_to_dbuv_rms: (value) => ({ dbuv: levelOfPeak(value) }),
    uv_per_m_to_dbuv_per_m: (value) => ({ dbuv_per_m: levelOfRms(value * 1e-6) }),
  }

  it.each(referenceCases('spectrum.db_conversion'))('$id', (item) => {
    const convert = conversions[z.string().parse(item.inputs['kind'])]
    expectWithin(item, convert?.(input(item, 'value')) ?? {})
    expect(convert).toBeDefined()
  })
})
