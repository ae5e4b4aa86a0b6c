import type { Source } from '../method/method'

const sources: readonly Source[] = [
  {
    citation:
      'C. R. Paul, Introduction to Electromagnetic Compatibility, ch. 3 (from memory; the coefficients are exact)',
    standing: 'published',
  },
  {
    citation: 'Fourier coefficients of a trapezoidal pulse with unequal edges',
    standing: 'derived here, checked from outside',
  },
  {
    citation: 'Knee frequency 0.5/t: H. Johnson, M. Graham, High-Speed Digital Design (from memory)',
    standing: 'published',
  },
]

/** The words of the method: what for, by which formulas, what to know besides. */
export const pulseTrainTexts = {
  title: 'Spectrum of a pulse train',
  purpose: 'Gives the harmonics of a switched voltage or clock, and the envelope that bounds them.',
  formulas: [
    'Û_n = A/(πn) · |sinc(n t_r/T) − sinc(n t_f/T) e^(−j 2πn τ/T)|,   sinc(x) = sin(πx)/(πx)',
    'Envelope: 2Aτ/T up to 1/(πτ), −20 dB a decade up to 1/(πt) of the faster edge t, −40 dB a decade above',
    'L = 20 lg(Û/√2 / 1 µV)',
  ],
  notes: [
    'Three rules tell “the bandwidth” of one edge and differ by a factor of 2: 0.35/t(10–90) is the −3 dB bandwidth of a first-order system with that step response; 0.5/t(10–90) says up to where a channel must be good for a digital edge; 1/(π t(0–100)) is where the spectrum begins to fall at 40 dB a decade. Say which one is meant, and whether the rise time is 10 to 90 or 0 to 100 %.',
    'Even harmonics of a square wave vanish only when both edges are equally fast.',
    'Levels are rms values, as a receiver shows for a sine even with its peak detector; the peak value is 3.01 dB higher.',
  ],
  cautions: ['A computed spectrum is an estimate, never a statement of conformity.'],
  sources,
} as const
