import { z } from 'zod'

import type { CaptureTolerance } from './case-file'
import type { Outputs } from './topic'
import { isWithin, relativeDifference, type Allowance, type Verdict } from './verdict'

const harmonics = z.array(z.object({ n: z.int(), f: z.number(), dbuv_rms: z.number().nullable() }))
const tones = z.array(z.object({ f: z.number(), dbuv_rms: z.number() }))

/** Settled levels may be off by this part of the amplitude: less than a step of an 8-bit instrument at half range. */
const levelShare = 0.015

/** Judges the analysis of a capture by the tolerances that lie with its truth; several channels by their names. */
export function judgeCapture(
  truth: Outputs,
  outputs: Outputs,
  tolerance: CaptureTolerance,
): readonly Verdict[] {
  return Object.entries(truth).flatMap(([output, expected]): readonly Verdict[] => {
    const got = outputs[output]
    if (isObject(expected)) {
      const inside = judgeCapture(expected, isObject(got) ? got : {}, tolerance)
      return inside.map((verdict) => ({ ...verdict, output: `${output}.${verdict.output}` }))
    }
    if (output === 'harmonics') return judgeHarmonics(expected, got, tolerance)
    if (output === 'tones') return judgeTones(expected, got, tolerance)
    return [judgeMeasure(output, expected, got, truth, tolerance)]
  })
}

const isObject = (value: unknown): value is Outputs =>
  typeof value === 'object' && value !== null && !Array.isArray(value)

function judgeMeasure(
  output: string,
  expected: unknown,
  got: unknown,
  truth: Outputs,
  tolerance: CaptureTolerance,
): Verdict {
  const verdict = { output, expected, got, difference: relativeDifference(got, expected) }
  if (tolerance.not_required.includes(output)) return { ...verdict, outcome: 'not judged' }
  if (expected === null) {
    // What is no ring must not be given a frequency; of other measures a truth may simply say nothing.
    if (output === 'ring_frequency') return { ...verdict, outcome: got === null ? 'pass' : 'miss' }
    return { ...verdict, outcome: 'not judged' }
  }
  if (typeof expected !== 'number') return { ...verdict, outcome: got === expected ? 'pass' : 'miss' }
  const allowance = allowanceOf(output, truth, tolerance)
  if (allowance === null) return { ...verdict, outcome: 'not judged' }
  const isPass = typeof got === 'number' && isWithin(got, expected, allowance)
  return { ...verdict, outcome: isPass ? 'pass' : 'miss' }
}

function allowanceOf(output: string, truth: Outputs, tolerance: CaptureTolerance): Allowance | null {
  switch (output) {
    case 'ring_frequency':
      return orNull({ relative: tolerance.ring_frequency_rel })
    case 'natural_frequency':
      return tolerance.not_required.includes('ring_frequency')
        ? null
        : orNull({ relative: tolerance.ring_frequency_rel })
    case 'damping_ratio':
      return orNull({ relative: tolerance.damping_ratio_rel })
    case 'rise_time_10_90':
    case 'fall_time_90_10':
      return orNull({ relative: tolerance.rise_time_rel })
    case 'overshoot_fraction':
      return orNull({ absolute: tolerance.overshoot_abs })
    case 'fundamental':
    case 'period':
      return orNull({ relative: tolerance.fundamental_rel })
    case 'duty_50':
      return orNull({ absolute: tolerance.duty_abs })
    case 'base_level':
    case 'top_level':
    case 'amplitude':
      return { absolute: levelShare * amplitudeOf(truth) }
    default:
      return null
  }
}

const orNull = ({ relative, absolute }: Allowance): Allowance | null =>
  relative === undefined && absolute === undefined ? null : { relative, absolute }

const amplitudeOf = ({ base_level: base, top_level: top, amplitude }: Outputs): number =>
  typeof base === 'number' && typeof top === 'number' ? Math.abs(top - base) : Number(amplitude)

function judgeHarmonics(expected: unknown, got: unknown, tolerance: CaptureTolerance): readonly Verdict[] {
  const wanted = harmonics.safeParse(expected)
  if (!wanted.success) return []
  const found = harmonics.safeParse(got)
  const {
    harmonic_min_dbuv: least = 0,
    harmonic_max_f: highest = Infinity,
    harmonic_db: off = 0.5,
  } = tolerance
  return wanted.data
    .filter(({ f, dbuv_rms: level }) => level !== null && level >= least && f <= highest)
    .map(({ n, dbuv_rms: level }) =>
      levelVerdict(
        `harmonic ${n}`,
        level,
        found.data?.find((candidate) => candidate.n === n)?.dbuv_rms ?? null,
        off,
      ),
    )
}

function judgeTones(expected: unknown, got: unknown, tolerance: CaptureTolerance): readonly Verdict[] {
  const wanted = tones.safeParse(expected)
  if (!wanted.success) return []
  const found = tones.safeParse(got)
  const { f_rel: near = 1e-4, level_db: off = 0.5 } = tolerance
  return wanted.data.map(({ f, dbuv_rms: level }) => {
    const match = found.data?.find((candidate) => Math.abs(candidate.f - f) <= near * f)
    return levelVerdict(`tone at ${f} Hz`, level, match?.dbuv_rms ?? null, off)
  })
}

function levelVerdict(output: string, expected: number | null, got: number | null, off: number): Verdict {
  const isPass = expected !== null && got !== null && Math.abs(got - expected) <= off
  return {
    output: `${output}, dBµV`,
    expected,
    got,
    difference: relativeDifference(got, expected),
    outcome: isPass ? 'pass' : 'miss',
  }
}
