import { err, ok, type Result } from '@/lib/core/result'
import { candidatesOf } from '@/lib/core/spectrum/comb'
import { dftAmplitudes } from '@/lib/core/spectrum/dft-amplitude'
import { mixingProducts } from '@/lib/core/spectrum/intermodulation'
import { levelOfPeak } from '@/lib/core/spectrum/level'
import { envelopeAt, envelopeOf, harmonicPeak, type PulseTrain } from '@/lib/core/spectrum/pulse-train'
import { windowFigures } from '@/lib/core/spectrum/window-response'

import type { Outputs, Topics } from '../topic'
import { topicOf } from '../topic-of'
import { conversions } from './level-conversions'
import {
  combSchema,
  conversionSchema,
  dftSchema,
  envelopeSchema,
  intermodulationSchema,
  trapezoidSchema,
  windowSchema,
} from './spectrum-schemas'

export const spectrumTopics: Topics = {
  'spectrum.trapezoid': topicOf(trapezoidSchema, (inputs) => {
    const train = trainOf(inputs)
    if (!train.ok) return train
    const levels = inputs.harmonics.map((n) => harmonicOutputs(train.value, n))
    return ok(Object.fromEntries(levels.flat()))
  }),
  'spectrum.envelope': topicOf(envelopeSchema, (inputs) => {
    const train = trainOf(inputs)
    return train.ok ? ok(envelopeOutputs(train.value, inputs.freqs)) : train
  }),
  'spectrum.window': topicOf(windowSchema, ({ cosine_coefficients }) => {
    const figures = windowFigures(cosine_coefficients)
    if (figures === null) return err('cosine_coefficients: these are no window with one main lobe around 0')
    return ok({
      coherent_gain: figures.coherentGain,
      enbw_bins: figures.noiseBandwidth,
      scallop_loss_db: figures.scallopLoss,
      bw_3db_bins: figures.width3dB,
      bw_6db_bins: figures.width6dB,
    })
  }),
  'spectrum.dft_amplitude': topicOf(dftSchema, ({ cosine_coefficients, fs, n, components, bins }) => {
    if (!((cosine_coefficients[0] ?? 0) > 0)) return err('cosine_coefficients: the first must be above 0')
    const outside = bins.find((bin) => 2 * bin > n)
    if (outside !== undefined) return err(`bins: ${outside} is above half of the record`)
    const record = Float64Array.from({ length: n }, (_, index) =>
      components.reduce(
        (sum, { peak, f, phase }) => sum + peak * Math.cos((2 * Math.PI * f * index) / fs + phase),
        0,
      ),
    )
    const amplitudes = dftAmplitudes(record, cosine_coefficients)
    return ok(Object.fromEntries(bins.map((bin) => [`bin${bin}_peak_amplitude`, amplitudes[bin]])))
  }),
  'spectrum.db_conversion': topicOf(conversionSchema, ({ kind, value }) => {
    const conversion = Object.hasOwn(conversions, kind) ? conversions[kind] : undefined
    if (conversion === undefined) return err(`kind: there is no conversion “${kind}”`)
    if (conversion.isPositive && !(value > 0)) return err('value: only a value above 0 has a level')
    const outputs = conversion.convert(value)
    const isFinite = Object.values(outputs).every(Number.isFinite)
    return isFinite ? ok(outputs) : err('value: out of the range of numbers')
  }),
  'spectrum.comb_matching': topicOf(combSchema, ({ sources, peaks, ...tolerances }) => {
    const combs = sources.map(({ name, f }) => ({ name, frequency: f }))
    const most = tolerances.max_harmonic
    const tolerance = {
      ppm: tolerances.tolerance_ppm,
      hertz: tolerances.tolerance_hz,
      ...(typeof most === 'number' ? { mostHarmonic: most } : {}),
    }
    const assignments = peaks.map((peak) =>
      candidatesOf(peak, combs, tolerance).map(({ source, harmonic }) => ({ source: source.name, harmonic })),
    )
    return ok({ assignments })
  }),
  'spectrum.intermodulation': topicOf(intermodulationSchema, ({ f1, f2, max_order, f_min, f_max }) => {
    if (f_min > f_max) return err('f_min: is above f_max')
    const products = mixingProducts(f1, f2, max_order, f_min, f_max)
    return ok({ products: products.map(({ frequency, order, m, n }) => ({ f: frequency, order, m, n })) })
  }),
}

type TrainInputs = {
  readonly amplitude: number
  readonly period: number
  readonly width_50: number
  readonly rise_0_100: number
  readonly fall_0_100: number
}

function trainOf(inputs: TrainInputs): Result<PulseTrain, string> {
  const { amplitude, period, width_50: width, rise_0_100: rise, fall_0_100: fall } = inputs
  const half = (rise + fall) / 2
  const roundingError = 1e-12 * period
  if (width >= period) return err('width_50: the pulse must be shorter than the period')
  if (half > width + roundingError || half > period - width + roundingError) {
    return err('width_50: the edges do not fit into the pulse and the pause')
  }
  return ok({ amplitude, period, width, rise, fall })
}

/** A null has no level; what is left of one by rounding is no harmonic. */
function harmonicOutputs(train: PulseTrain, n: number): readonly (readonly [string, number])[] {
  const peak = harmonicPeak(train, n)
  const isNull = peak < 1e-13 * train.amplitude
  return [[`h${n}_peak`, peak], ...(isNull ? [] : [[`h${n}_dbuv`, levelOfPeak(peak)] as const])]
}

function envelopeOutputs(train: PulseTrain, frequencies: readonly number[]): Outputs {
  const envelope = envelopeOf(train)
  const fastest1090 = 0.8 * Math.min(train.rise, train.fall)
  const levels = frequencies.map((frequency) => [
    `env_dbuv_at_${generalFormat(frequency)}`,
    levelOfPeak(envelopeAt(envelope, frequency)),
  ])
  return {
    plateau_peak: envelope.plateau,
    corner1: envelope.firstCorner,
    corner2: envelope.secondCorner,
    bandwidth_0_35_over_tr1090: 0.35 / fastest1090,
    bandwidth_knee_0_5_over_tr1090: 0.5 / fastest1090,
    bandwidth_1_over_pi_tr: envelope.secondCorner,
    ...Object.fromEntries(levels),
  }
}

/** A number as the general format of C and Python writes it: six digits, an exponent from 10⁶ on. */
function generalFormat(value: number): string {
  const [mantissa = '', exponent = '0'] = value.toExponential(5).split('e')
  const power = Number(exponent)
  if (power >= -4 && power < 6) return String(Number(value.toPrecision(6)))
  const sign = power < 0 ? '-' : '+'
  return `${Number(mantissa)}e${sign}${String(Math.abs(power)).padStart(2, '0')}`
}
