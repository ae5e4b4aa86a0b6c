import { describe, expect, it } from 'vitest'

import { caseOfDescription, parseCaseFile } from '@/lib/reference/case-file'
import { judgeCapture } from '@/lib/reference/judge-capture'
import { judgeOutputs } from '@/lib/reference/judge-outputs'

const [item] = parseCaseFile(
  JSON.stringify({
    cases: [
      {
        id: 'one',
        topic: 'some.topic',
        inputs: {},
        expected: { a: 100, b: 10, list: [{ f: 1, name: 'x' }], power_rule_cv2f: 3 },
        tolerance_rel: 0.01,
        tolerance_abs_by_output: { b: 0.5 },
      },
    ],
  }),
)
if (!item) throw new Error('A case was expected')

const outcomes = (outputs: Readonly<Record<string, unknown>>) =>
  Object.fromEntries(judgeOutputs(item, outputs).map(({ output, outcome }) => [output, outcome]))

describe('judging the outputs of a case', () => {
  const right = { a: 100.9, b: 10.4, list: [{ f: 1.005, name: 'x' }], power_rule_cv2f: 3 }

  it('passes what is within its tolerance', () => {
    expect(outcomes(right)).toEqual({ a: 'pass', b: 'pass', list: 'pass', power_rule_cv2f: 'pass' })
  })

  it.each([
    ['a number beyond the relative tolerance', { a: 101.1 }, 'a'],
    ['a number beyond its own absolute tolerance', { b: 10.6 }, 'b'],
    ['a missing number', { a: undefined }, 'a'],
    ['not a number', { a: Number.NaN }, 'a'],
    [
      'a list that is too long',
      {
        list: [
          { f: 1, name: 'x' },
          { f: 2, name: 'y' },
        ],
      },
      'list',
    ],
    ['another name inside a list', { list: [{ f: 1, name: 'y' }] }, 'list'],
    ['a wrong comparison value', { power_rule_cv2f: 4 }, 'power_rule_cv2f'],
  ])('misses %s', (_, change, output) => {
    expect(outcomes({ ...right, ...change })[output]).toBe('miss')
  })

  it('does not ask for a comparison value', () => {
    expect(outcomes({ ...right, power_rule_cv2f: undefined })['power_rule_cv2f']).toBe('not judged')
  })
})

const capture = caseOfDescription(
  JSON.stringify({
    file: 'made.csv',
    tolerance: { ring_frequency_rel: 0.01, overshoot_abs: 0.03, harmonic_db: 0.5, harmonic_min_dbuv: 100 },
    truth: {
      ring_frequency: 100e6,
      overshoot_fraction: 0.5,
      base_level: 0,
      top_level: 12,
      harmonics: [
        { n: 1, f: 5e5, dbuv_rms: 120 },
        { n: 2, f: 1e6, dbuv_rms: 90 },
        { n: 3, f: 1.5e6, dbuv_rms: null },
      ],
      GATE: { ring_frequency: null },
    },
  }),
)

const judged = (outputs: Readonly<Record<string, unknown>>) =>
  Object.fromEntries(
    judgeCapture(capture.expected, outputs, capture.tolerance ?? { not_required: [] }).map(
      ({ output, outcome }) => [output, outcome],
    ),
  )

describe('judging the analysis of a capture', () => {
  const right = {
    ring_frequency: 100.9e6,
    overshoot_fraction: 0.52,
    base_level: 0.1,
    top_level: 11.9,
    harmonics: [{ n: 1, f: 5e5, dbuv_rms: 119.6 }],
    GATE: { ring_frequency: null },
  }

  it('passes what is within the tolerances, and judges no harmonic below the floor', () => {
    expect(judged(right)).toEqual({
      ring_frequency: 'pass',
      overshoot_fraction: 'pass',
      base_level: 'pass',
      top_level: 'pass',
      'harmonic 1, dBµV': 'pass',
      'GATE.ring_frequency': 'pass',
    })
  })

  it.each([
    ['ring_frequency', { ring_frequency: 101.1e6 }],
    ['ring_frequency', { ring_frequency: null }],
    ['overshoot_fraction', { overshoot_fraction: 0.54 }],
    ['top_level', { top_level: 11.7 }],
    ['harmonic 1, dBµV', { harmonics: [{ n: 1, f: 5e5, dbuv_rms: 119.4 }] }],
    ['harmonic 1, dBµV', { harmonics: [] }],
    ['GATE.ring_frequency', { GATE: { ring_frequency: 1e6 } }],
    ['GATE.ring_frequency', { GATE: undefined }],
  ])('misses a wrong %s', (output, change) => {
    expect(judged({ ...right, ...change })[output]).toBe('miss')
  })
})
