import type { Source } from '../method/method'

const sources: readonly Source[] = [
  {
    citation: 'R. W. Erickson, Optimal Single Resistor Damping of Input Filters, APEC 1999',
    standing: 'published',
  },
  {
    citation:
      'R. D. Middlebrook, Input Filter Considerations in Design and Application of Switching Regulators, 1976 (from memory)',
    standing: 'published',
  },
  {
    citation: 'Least peak of the output impedance, by direct minimisation',
    standing: 'derived here, checked from outside',
  },
]

/** The words of the method: what for, by which formulas, what to know besides. */
export const filterDampingTexts = {
  title: 'Damping of an input filter',
  purpose:
    'Chooses a resistor in series with a second capacitor across an LC filter so that its output impedance peaks least.',
  formulas: [
    'R₀ = √(L/C),   n = C_d/C',
    'R_d = R₀ √((2 + n)(4 + 3n) / (2n²(4 + n)))',
    '|Z|max = R₀ √(2(2 + n)) / n   at   f₀ √(2/(2 + n))',
    'Stability: |Z|max well below V_in²/P_in',
  ],
  notes: [
    'This optimum has the least peak of impedance. A snubber’s has the least peak in time and is another: for a ratio of 4 it is 0.87 Z₀, and 0.61 R₀ here. Neither serves for the other.',
    'An electrolytic capacitor’s own resistance can be the damping resistor; it changes with temperature and age.',
    'A converter draws less current at more voltage: its incremental input resistance is negative, −V²/P, and worst at low voltage and full power.',
  ],
  cautions: [
    'A filter that makes a converter oscillate can destroy it: try it with a current-limited source first.',
  ],
  sources,
} as const
