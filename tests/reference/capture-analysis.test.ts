import { readdirSync, readFileSync } from 'node:fs'

import { describe, expect, it } from 'vitest'

import { caseOfDescription } from '@/lib/reference/case-file'
import { judgeCapture } from '@/lib/reference/judge-capture'
import type { Outputs } from '@/lib/reference/topic'
import { captureTopics } from '@/lib/reference/topics/capture'

import { captureBytes } from './capture-bytes'

const folder = new URL('./captures/', import.meta.url)

function outputsOf(file: string): Outputs {
  const answered = captureTopics['capture.analysis']?.({ file }, captureBytes)
  if (!answered?.ok) throw new Error(answered?.error ?? 'no topic')
  return answered.value
}

// Truths: poles and residues of the circuits (sampled with ngspice), exact Fourier series, or the sines themselves; each
// file names its own.
describe('captures within the tolerances of their truths', () => {
  const descriptions = readdirSync(folder).filter((name) => name.endsWith('.json'))

  it.each(descriptions)('%s', (name) => {
    const item = caseOfDescription(readFileSync(new URL(name, folder), 'utf8'))
    const file = name.replace(/\.json$/u, '')
    const outputs = outputsOf(
      readdirSync(folder).find((other) => other.startsWith(`${file}.`) && other !== name) ?? `${file}.csv`,
    )
    if (item.tolerance === undefined) throw new Error('a description without tolerances')
    const verdicts = judgeCapture(item.expected, outputs, item.tolerance)
    expect(verdicts.filter(({ outcome }) => outcome === 'miss')).toEqual([])
    expect(verdicts.filter(({ outcome }) => outcome === 'pass').length).toBeGreaterThan(3)
  })
})

describe('what the captures are told apart by', () => {
  it('calls the overshoot of the cut-off record a lower bound, below the truth, and rebuilds its peak', () => {
    const {
      overshoot_is_lower_bound: isBound,
      overshoot_measured: measured,
      overshoot_fraction: rebuilt,
    } = outputsOf('o11_clipped.csv')
    expect(isBound).toBe(true)
    expect(Number(measured)).toBeCloseTo((39.828125 - 24) / 24, 2)
    expect(Number(rebuilt)).toBeCloseTo(0.8924, 1)
  })

  it.each(['o01_bare.csv', 'o06_falling_tab.tsv', 'o07_trapezoid_half_duty.csv', 'o12_first_order.csv'])(
    'calls no other record cut off: %s',
    (file) => expect(outputsOf(file).overshoot_is_lower_bound).toBe(false),
  )

  it('gives no ring to the snubbed node and the first-order edge, and says why', () => {
    expect(outputsOf('o03_snubbed.csv')).toMatchObject({
      ring_frequency: null,
      ring_absence:
        'Less than one full cycle stands above the noise after the edge, too little to tell a frequency.',
    })
    expect(outputsOf('o12_first_order.csv')).toMatchObject({
      ring_frequency: null,
      ring_absence: 'No oscillation stands above the noise after the edge.',
    })
  })

  it('finds the peak of a falling edge below its top level', () => {
    expect(Number(outputsOf('o06_falling_tab.tsv').peak_level)).toBeCloseTo(-21.77, 1)
  })

  it('calls even harmonics of the half-duty trapezoid lost in the noise', () => {
    const { harmonics } = outputsOf('o07_trapezoid_half_duty.csv')
    expect(harmonics).toEqual(
      expect.arrayContaining([
        expect.objectContaining({ n: 3, dbuv_rms: expect.closeTo(125.1, 0) }),
        expect.objectContaining({ n: 200, dbuv_rms: null }),
      ]),
    )
  })

  it('finds neither edges nor a ring in a supply rail with noise only', () => {
    expect(outputsOf('o05_four_channels.csv').VIN).toMatchObject({
      ring_frequency: null,
      edge: null,
      amplitude: null,
    })
  })
})
