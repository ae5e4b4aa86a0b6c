import type { Source } from '../method/method'

const sources: readonly Source[] = [
  { citation: 'Designing RC snubbers, Nexperia AN11160, Rev. 3.0, 2023', standing: 'published' },
  {
    citation: 'Switch Node Ring Control in TinyBuck Regulators, Fairchild Semiconductor AN-4162',
    standing: 'published',
  },
  {
    citation: 'Transfer function, optimum of damping in closed form, energies: derived for this network',
    standing: 'derived here, checked from outside',
  },
  { citation: 'IEC 60063, Preferred number series for resistors and capacitors', standing: 'published' },
]

/** The words of the method: what for, by which formulas, what to know besides. */
export const rcSnubberTexts = {
  title: 'RC snubber by the exact network',
  purpose:
    'Chooses a resistor and a capacitor across a ringing switch node and predicts the waveform, the damping and the heat.',
  formulas: [
    'H(s) = (1 + kρs) / (kρs³ + (1 + k + kρr)s² + (kρ + r(1 + k))s + 1)',
    'k = C_s/C_par,   ρ = R_s/Z₀,   r = R/Z₀,   time in √(L_par C_par)',
    'Most damping, r = 0, k ≤ 8:   R_s = Z₀ (1 + k)^¾ / k,   ζ = (√(1 + k) − 1)/2',
    'Least overshoot: by search over the exact response to the edge',
    'R_s and C_s alone, square wave: P = C_s V² f tanh(1/(4 f R_s C_s))',
    'P = 2 f ∫ i² R dt of the exact currents;   for an ideal step, all resistances: (C_s + C_par) V² f',
  ],
  notes: [
    '“R_s = Z₀” is right only near k = 3; it is too small for k < 2.5 and too large for k > 3. The optimum is flat: between 0.85 and 1.1 Z₀ at k = 3 the overshoot changes by half a percent of the step.',
    '“P = C_s V² f” is the share of R_s only where the energy of C_par is burnt elsewhere. Size the resistor for (C_s + C_par) V² f.',
    'The optimum of a turn-off snubber without node capacitance is another problem; its resistance is not used here.',
  ],
  cautions: [
    'Snubber resistors run hot: choose the rating for the loss at the highest input voltage and the board’s temperature, and keep them clear of parts that must stay cool.',
    'Choose C0G or film for C_s with a voltage rating above the peak; the peak current must be within the part’s limit.',
  ],
  sources,
} as const
