import type { ChoiceInput, QuantityInput } from '../method/input-definition'
import type { ChoiceTable, ResultValue, Source } from '../method/method'
import { main, step } from '../method/result-value'
import { cosineWindows } from '../spectrum/cosine-window'
import { instantInput, probingCaution } from '../waveform/capture-method'
import type { CaptureSpectrum, ReceiverReading } from './capture-spectrum'

const window: ChoiceInput = {
  kind: 'choice',
  label: 'Window',
  symbol: 'w',
  help: 'Not used where the record holds whole periods of everything strong in it',
  isRequired: true,
  options: Object.fromEntries(cosineWindows.map(({ id, name }) => [id, name])),
}

const tuned: QuantityInput = {
  label: 'Receiver tuned to',
  symbol: 'f',
  unit: 'Hz',
  help: 'Left empty, no detectors are read',
  isRequired: false,
  atLeast: 9e3,
  atMost: 18e9,
}

const sources: readonly Source[] = [
  {
    citation:
      'F. J. Harris, “On the use of windows for harmonic analysis with the DFT”, Proc. IEEE 66(1), 1978, 51-83 (from memory)',
    standing: 'published',
  },
  {
    citation:
      'CISPR 16-1-1: bandwidths and time constants of measuring receivers (read in public copies; those of bands C and D from memory)',
    standing: 'published',
  },
  {
    citation: 'Frequency and level of a line between two bins from the closed form of the window',
    standing: 'derived here, checked from outside',
  },
]

/**
 * The spectrum of a capture as a method of the practice: what it states beside its numbers.
 * A change of `captureSpectrum` that alters results is a new version.
 */
export const captureSpectrumMethod = {
  id: 'capture-spectrum',
  version: 1,
  title: 'Spectrum of a capture',
  purpose: 'Gives the lines in a part of a capture with their levels, and what a receiver would read of it.',
  inputs: {
    from: instantInput('Part from', 't₁', 'Left empty, the start of the record'),
    to: instantInput('Part to', 't₂', 'Left empty, the end of the record'),
    window,
    tuned,
  },
  formulas: [
    'Û(f_k) = 2|X[k]|/Σw,   X[k] = Σ w[n] (u[n] − ū) e^(−j2πkn/N)',
    'L = 20 lg(Û/(√2 · 1 µV))',
    'RBW = ENBW · f_s/N,   ENBW = (a₀² + ½ Σ a_k²)/a₀²',
    'Û = Û(f_k)/[W(δ)/W(0)],   δ = (f − f_k) N/f_s',
  ],
  notes: [
    'A level is the rms value of a sine, as a receiver shows it even with its peak detector. It is the voltage at the probe tip, not at a line impedance stabilisation network or an antenna.',
    'The level of a line does not depend on the RBW; that of noise rises by 10 lg, that of short pulses by 20 lg of it. Compare spectra of the same RBW only.',
    'A capture is short: a quasi-peak is simulated only where the record lasts 3 discharge and 5 meter time constants. From a shorter record of pulses that repeat it is estimated from their rate, and else it is no more than the peak.',
    'What lies above half the sample rate folds back; an 8-bit record shows little below 60 dB under its strongest line.',
  ],
  cautions: [
    'Levels at a probe tip are no conducted or radiated emission and say nothing about conformity; that is for an accredited laboratory under the standard in force.',
    probingCaution,
  ],
  sources,
} as const

/** The numbers of a spectrum with their names and units. */
export function captureSpectrumResults({
  spectrum,
  tones,
  floorLevel,
  reading,
}: CaptureSpectrum): readonly ResultValue[] {
  const [strongest] = tones
  return [
    ...(strongest === undefined
      ? []
      : [
          main('frequency', 'Strongest line', 'f', 'Hz', strongest.frequency),
          main('level', 'Level of the strongest line', 'L', 'dBµV', strongest.level),
        ]),
    main('resolutionBandwidth', 'Equivalent resolution bandwidth', 'RBW', 'Hz', spectrum.resolutionBandwidth),
    ...(reading === null ? [] : readingResults(reading)),
    step('binWidth', 'Width of a bin', 'f_s/N', 'Hz', spectrum.binWidth),
    step('samples', 'Samples used', 'N', '', spectrum.sampleCount),
    step('lines', 'Lines above the noise', 'n', '', tones.length),
    step('floor', 'Least line above the noise', 'L_min', 'dBµV', floorLevel),
  ]
}

function readingResults({ band, readings }: ReceiverReading): readonly ResultValue[] {
  const { quasiPeak } = readings
  const label = {
    simulated: 'Quasi-peak',
    estimated: 'Quasi-peak, estimated from the pulse rate',
    'at most': 'Quasi-peak, at most',
  }[quasiPeak.kind]
  return [
    main('peak', 'Peak detector', 'PK', 'dBµV', readings.peak),
    main('average', 'Average detector', 'AV', 'dBµV', readings.average),
    main('quasiPeak', label, 'QP', 'dBµV', quasiPeak.level),
    step('receiverBandwidth', `Bandwidth of band ${band.id}, at −6 dB`, 'B₆', 'Hz', band.bandwidth),
  ]
}

const listed = 30

/** The strongest lines, one a row. */
export const captureSpectrumLines = ({ tones }: CaptureSpectrum): ChoiceTable => ({
  title: 'Strongest lines',
  columns: [
    { label: 'Frequency', unit: 'Hz' },
    { label: 'Peak value', unit: 'V' },
    { label: 'Level', unit: 'dBµV' },
  ],
  rows: tones.slice(0, listed).map(({ frequency, amplitude, level }) => [frequency, amplitude, level]),
})
