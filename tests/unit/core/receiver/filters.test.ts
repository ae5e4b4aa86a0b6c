import { describe, expect, it } from 'vitest'

import { coupledStagesBandwidths, coupledStagesGain } from '@/lib/core/receiver/filter-bandwidths'
import { gaussianBandwidths, impulseShape } from '@/lib/core/receiver/filter-bandwidths'

describe('the filter models of a receiver', () => {
  it('Gaussian: impulse 1.0645, noise 0.7527, 3 dB 0.7071 of the 6 dB width', () => {
    const { impulse, noise, width3dB } = gaussianBandwidths(1)
    expect([impulse, noise, width3dB].map((width) => width.toFixed(4))).toEqual([
      '1.0645',
      '0.7527',
      '0.7071',
    ])
  })

  // Source: 1.05 B₆ of CISPR 16-1-1, from memory; the rest derived.
  it('coupled stages: impulse 1.0482, noise 0.8330, 3 dB 0.8022 of the 6 dB width', () => {
    const { impulse, noise, width3dB } = coupledStagesBandwidths(1)
    expect([impulse, noise, width3dB].map((width) => width.toFixed(4))).toEqual([
      '1.0482',
      '0.8330',
      '0.8022',
    ])
  })

  it('have their widths where the gain says so, and the noise bandwidth by adding it up', () => {
    const size = (offset: number) => Math.hypot(...coupledStagesGain(9e3, offset))
    expect(size(0)).toBeCloseTo(1, 12)
    expect(size(4500)).toBeCloseTo(0.5, 12)
    expect(size(coupledStagesBandwidths(9e3).width3dB / 2)).toBeCloseTo(Math.SQRT1_2, 12)
    let sum = 0
    for (let offset = -200e3; offset <= 200e3; offset += 50) sum += 50 * size(offset) ** 2
    expect(sum / coupledStagesBandwidths(9e3).noise).toBeCloseTo(1, 6)
  })

  it('have an impulse response whose sum is the gain in the middle', () => {
    let sum = 0
    for (let x = 0; x < 40; x += 0.001) sum += 0.001 * 2 * impulseShape(x)
    expect(sum).toBeCloseTo(1, 5)
  })
})
