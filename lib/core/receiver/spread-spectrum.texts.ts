import type { Source } from '../method/method'

const sources: readonly Source[] = [
  {
    citation: 'Width of a frequency-modulated line: J. R. Carson, Proc. IRE 10, 1922 (from memory)',
    standing: 'published',
  },
  {
    citation: 'Sidebands by Fourier transform through the receiver model of CISPR 16-1-1',
    standing: 'derived here, checked from outside',
  },
]

/** The words of the method: what for, by which formulas, what to know besides. */
export const spreadSpectrumTexts = {
  title: 'Effect of spread spectrum',
  purpose: 'Gives how much lower a receiver reads a harmonic when the frequency of its source is swept.',
  formulas: [
    'W = h Δ f₀;   power evenly spread: 10 lg(W/max(B_n, f_m))',
    'Sidebands c_n of exp(jφ), dφ/dt = 2π × frequency offset, through |H| = 4ω₀⁴/(4ω₀⁴ + ω⁴), to the detectors',
    'Tuned where the reading is highest, as a scan finds it',
  ],
  notes: [
    'The power is not lowered, it is spread: the peak of the waveform over time, ripple and the noise in a wide receiver stay as they are, and a victim whose bandwidth is wider than the sweep gains nothing.',
    'The often quoted 10 lg(W/RBW) holds for power. Where a sweep crosses the filter slower than about RBW² per second, its full height passes, and a peak or quasi-peak detector gains much less; at the turning points of the sweep it crosses twice in a short time.',
    'Low harmonics with h Δ f₀ below the resolution bandwidth gain nothing.',
    'A modulation rate in the audible range, or in the passband of a receiver nearby, can be heard where a steady carrier was not.',
    'A sine lingers at the edges of the sweep and gains less than a triangle.',
  ],
  cautions: [
    'Whether spreading is allowed in a test, and with which dwell time, is for the standard in force and the laboratory.',
  ],
  sources,
  example: { frequency: '420 kHz', spread: '6 %', rate: '9 kHz', profile: 'triangle', harmonic: '100' },
} as const
