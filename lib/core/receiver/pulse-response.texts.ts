import type { Source } from '../method/method'

const sources: readonly Source[] = [
  {
    citation:
      'CISPR 16-1-1, receiver model and pulse response (from memory; bandwidths and times of A and B in public pages)',
    standing: 'published',
  },
  {
    citation: 'Time-domain simulation of filter, rectifier and meter',
    standing: 'derived here, checked from outside',
  },
]

/** The words of the method: what for, by which formulas, what to know besides. */
export const pulseResponseTexts = {
  title: 'Receiver readings of pulses',
  purpose:
    'Gives what a CISPR receiver reads of short repeated pulses with its peak, quasi-peak and average detectors.',
  formulas: [
    'Envelope of one pulse: 4ω₀S e^(−ω₀t) (sin ω₀t − ω₀t cos ω₀t),   ω₀ = πB₆/√2',
    'Peak = 20 lg(√2 S B_imp/1 µV),   B_imp = 1.048 B₆',
    'Rectifier: dU/dt = (k/π)(E sin θ − θU) − U/T_D,   cos θ = U/E,   k from 63 % in T_C',
    'Meter: T_M² y″ + 2T_M y′ + y = U, critically damped; reading = maximum',
  ],
  notes: [
    'A detector coded as an exponential charge with the time constant T_C over-reads rare pulses by 1 to 2 dB: the diode conducts only over a part of each period of the carrier, and the charging slows down as the capacitor fills.',
    'The published table gives the level for a constant indication, so its sign is opposite to that of the reading.',
    'A quasi-peak from a recorded waveform needs a record of at least 3 T_D + 5 T_M: 1.3 s in band B, 2.2 s in C and D. From a shorter one say “no more than the peak”, or estimate from the pulse rate, as here.',
    'The tolerance of the pulse area shifts the quasi-peak reading by the same dB as the peak reading.',
  ],
  cautions: ['A computed reading is an estimate, never a statement of conformity.'],
  sources,
  example: { band: 'B', area: '0.316 µVs', rate: '100 Hz' },
} as const
