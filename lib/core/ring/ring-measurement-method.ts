import type { ResultValue, Source } from '../method/method'
import { main, step } from '../method/result-value'
import { instantInput, probingCaution } from '../waveform/capture-method'

import type { RingMeasurement } from './ring-measurement'

const sources: readonly Source[] = [
  {
    citation:
      'IEEE Std 181-2011, Transitions, Pulses, and Related Waveforms: state levels by histogram, transition time, overshoot',
    standing: 'published',
  },
  {
    citation:
      'Damped sinusoid fitted by least squares; logarithmic decrement: second-order theory of one damped mode',
    standing: 'derived here, checked from outside',
  },
]

/**
 * The measurement of an edge and its ring as a method of the practice: what it states beside its numbers.
 * A change of `measureRing` that alters results is a new version.
 */
export const ringMeasurementMethod = {
  id: 'ring-measurement',
  version: 1,
  title: 'Ring of a capture',
  purpose: 'Measures the first edge in a window of a capture and the ringing after it.',
  inputs: {
    from: instantInput('Window from', 't₁', 'Before the edge; left empty, the start of the record'),
    to: instantInput('Window to', 't₂', 'Before the next edge; left empty, the end of the record'),
  },
  formulas: [
    'v(t) = v_top + A e^(−αt) cos(2π f_d t + φ), by least squares over the ring',
    'f_d = frequency of the fitted sinusoid',
    'f_n = f_d / √(1 − ζ²)',
    'δ = α / f_d',
    'ζ = δ / √(4π² + δ²)',
    'Q = 1 / (2ζ)',
    'OS = (v_peak − v_top) / (v_top − v_base)',
    't_r = time from 10 % to 90 % of the way from v_base to v_top',
    'v_base, v_top = modes of the histogram before and after the edge',
  ],
  notes: [
    'The ring that is seen is the damped one, f_d. A formula for L and C needs the undamped f_n: give f_d together with ζ, or f_n without it, never both corrections.',
    'The probe’s own capacitance is part of what rings.',
  ],
  cautions: [probingCaution],
  sources,
} as const

/** The numbers of a measurement with their names and units; without a ring, those of the edge alone. */
export function ringResults(measurement: RingMeasurement, unit: 'V' | 'A' | ''): readonly ResultValue[] {
  const { edge, levels, ring } = measurement
  const bound = measurement.overshootIsLowerBound ? 'Overshoot, at least' : 'Overshoot'
  return [
    ...(ring === null
      ? []
      : [
          main('dampedFrequency', 'Ring frequency', 'f_d', 'Hz', ring.dampedFrequency),
          main('dampingRatio', 'Damping ratio', 'ζ', '', ring.dampingRatio),
          main('qualityFactor', 'Quality factor', 'Q', '', ring.qualityFactor),
        ]),
    main('overshoot', bound, 'OS', '%', 100 * measurement.overshootFraction),
    main('transitionTime', 'Transition time, 10 to 90 %', 't_r', 's', edge.transitionSeconds),
    step('base', 'Base level', 'v_base', unit, levels.base),
    step('top', 'Top level', 'v_top', unit, levels.top),
    step('peak', 'Peak', 'v_peak', unit, levels.peak),
    step('edgeInstant', 'Instant of the edge, at 50 %', 't₀', 's', edge.instantSeconds),
    ...(ring === null
      ? []
      : [
          step('naturalFrequency', 'Undamped ring frequency', 'f_n', 'Hz', ring.naturalFrequency),
          step('logDecrement', 'Logarithmic decrement', 'δ', '', ring.logDecrement),
          step('cyclesUsed', 'Cycles that the fit rests on', 'n', '', ring.cyclesUsed),
          step('residualRms', 'Rms of what the fit leaves over', 'r', unit, ring.fit.residualRms),
        ]),
  ]
}
