import { describe, expect, it } from 'vitest'

import type { RawInput } from '@/lib/core/method/input-definition'
import { findMethod } from '@/lib/core/method/registry'
import type { MethodRun } from '@/lib/core/method/run-method'
import { valueOf } from '@/tests/support/value-of'

const methodOf = (id: string) => {
  const method = findMethod(id)
  if (!method) throw new Error(`no method ${id}`)
  return method
}

const run = (id: string, changes: Readonly<Record<string, RawInput>> = {}): MethodRun => {
  const method = methodOf(id)
  return valueOf(method.run({ ...method.example, ...changes }))
}

const result = ({ outcome }: MethodRun, key: string): number =>
  outcome.results.find((each) => each.key === key)?.value ?? NaN

const refused = (id: string, inputs: Readonly<Record<string, RawInput>>): string => {
  const answer = methodOf(id).run(inputs)
  return answer.ok ? 'ok' : [answer.error.message, ...Object.values(answer.error.fields)].join(' ')
}

const ids = [
  'scan-margin',
  'harmonic-attribution',
  'mixing-products',
  'spread-spectrum-effect',
  'receiver-pulse-response',
  'spectral-window',
  'decibel-conversion',
  'distance-conversion',
]

describe('the methods about spectrum and limits', () => {
  it.each(ids)('%s: its worked example computes, twice to the same digits', (id) => {
    const first = run(id)
    expect(first.outcome.results.length).toBeGreaterThan(0)
    expect(JSON.stringify(run(id))).toBe(JSON.stringify(first))
  })

  it('scan margin: the smallest margin, its place, and what lies outside', () => {
    // 66 − 19.12 lg(420/150) = 57.45 dBµV at 420 kHz; 58.9 is 1.45 dB over it.
    const scan = run('scan-margin')
    expect(result(scan, 'worst')).toBeCloseTo(-1.45, 2)
    expect(result(scan, 'worstFrequency')).toBe(420e3)
    expect(result(scan, 'over')).toBe(1)
    const moved = run('scan-margin', {
      correction: '-2',
      points: '420k; 58.9\n50 MHz; 10',
      highest: '200 MHz',
    })
    expect(result(moved, 'worst')).toBeCloseTo(0.55, 2)
    expect(result(moved, 'outside')).toBe(1)
    expect(result(moved, 'upTo')).toBe(2e9)
  })

  it('scan margin: says what the numbers of a limit stand on, and what a detector cannot say', () => {
    const unverified = run('scan-margin', { limit: 'mil-std-461g-ce102-28v' })
    expect(
      unverified.outcome.validity.some(({ passed, sentence }) => !passed && sentence.includes('from memory')),
    ).toBe(true)
    const average = run('scan-margin', { detector: 'average' })
    expect(average.outcome.validity[0]).toMatchObject({ passed: false })
    const peak = run('scan-margin', { detector: 'peak' })
    expect(peak.outcome.validity[0]).toMatchObject({ passed: true })
  })

  it('scan margin: refuses a scan that the limit does not cover', () => {
    const { limit, detector } = methodOf('scan-margin').example
    expect(
      refused('scan-margin', { limit: limit ?? '', detector: detector ?? '', points: '500; 40' }),
    ).toContain('covers none')
  })

  it('scan margin: the tolerance of the correction is that of the margin', () => {
    const method = methodOf('scan-margin')
    const run = valueOf(method.run({ ...method.example, correction: '1' }, { correction: '2 dB' }))
    const interval = run.uncertainty?.intervals.find(({ key }) => key === 'worst')
    expect((interval?.high ?? 0) - (interval?.low ?? 0)).toBeCloseTo(3.8, 0)
  })

  it('harmonic attribution: one source, several, none', () => {
    const attribution = run('harmonic-attribution')
    expect(result(attribution, 'unexplained')).toBe(1)
    // 168 MHz is both 400 × 420 kHz and 7 × 24 MHz.
    expect(result(attribution, 'ambiguous')).toBe(1)
    expect(attribution.outcome.choices[1]?.rows[0]?.at(-1)).toContain('move or stop one source')
  })

  it('mixing products: names the products in a band', () => {
    const products = run('mixing-products', {
      sources: 'a; 10 MHz\nb; 11 MHz',
      bands: 'near; 8.9 MHz; 9.1 MHz\nclear; 50 MHz; 51 MHz',
      order: '3',
    })
    expect(products.outcome.choices[0]?.rows).toEqual([['near', '2·a − 1·b', 3, 9e6]])
    expect(result(products, 'clear')).toBe(1)
    expect(refused('mixing-products', { sources: 'a; 1M\nb; 2M', bands: 'x; 3M; 2M', order: '3' })).toContain(
      'below its beginning',
    )
  })

  it('spread spectrum: gains nothing at a low harmonic, and says so', () => {
    const low = run('spread-spectrum-effect', { harmonic: '1' })
    // 6 % of 420 kHz is 25.2 kHz, over 9 kHz; of harmonic 1 with 1 % it is less.
    const none = run('spread-spectrum-effect', { harmonic: '1', spread: '1 %' })
    expect(result(low, 'width')).toBeCloseTo(25.2e3, 6)
    expect(result(none, 'peak')).toBeLessThan(0.5)
    expect(none.outcome.validity[0]).toMatchObject({ passed: false })
  })

  it('receiver: 0.316 µVs at 100 Hz in band B read near 66 dBµV quasi-peak', () => {
    const read = run('receiver-pulse-response')
    expect(result(read, 'quasiPeak')).toBeCloseTo(66.4, 1)
    expect(result(read, 'peak')).toBeCloseTo(72.5, 1)
    expect(result(read, 'average')).toBeCloseTo(34.09, 1)
  })

  it('window: a million values at 1 GHz under a five-term flat top resolve 3.77 kHz', () => {
    const window = run('spectral-window')
    expect(result(window, 'resolution')).toBeCloseTo(3770.2, 0)
    expect(result(window, 'duration')).toBeCloseTo(3.7702 / 9e3, 6)
  })

  it('levels: −47 dBm are 59.99 dBµV; two values at once are refused', () => {
    expect(result(run('decibel-conversion'), 'level')).toBeCloseTo(59.9897, 4)
    expect(refused('decibel-conversion', { power: '-47', rms: '1' })).toContain('exactly one')
    expect(refused('decibel-conversion', {})).toContain('exactly one')
  })

  it('distance: 43 dBµV/m at 3 m are 32.54 at 10 m', () => {
    expect(result(run('distance-conversion'), 'converted')).toBeCloseTo(32.542, 3)
  })
})
