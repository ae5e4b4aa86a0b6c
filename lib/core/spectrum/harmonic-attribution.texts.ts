/** The words of the method: what for, by which formulas, what to know besides. */
export const harmonicAttributionTexts = {
  title: 'Which source makes which peak',
  purpose:
    'Names, for every measured peak, each source and harmonic that it may be, and what cannot be told apart.',
  formulas: [
    'Peak p may be harmonic h of f where |p − h f| ≤ h f · ppm · 10⁻⁶ + RBW/2',
    'Two sources separate at harmonic h only where h |f₁ − f₂| > 2 × tolerance',
  ],
  notes: [
    'A match in frequency is no proof: the more sources and the higher the harmonic, the more peaks match by chance. Stop or move one source, and see whether the peak follows.',
    'A spread-spectrum source needs its spread as the tolerance: ±2 % is 20 000 ppm.',
    'A peak without a source may be a mixing product, an ambient line, or a source that nobody named.',
  ],
  cautions: [],
  sources: [
    { citation: 'Arithmetic of harmonics and tolerances', standing: 'derived here, checked from outside' },
    { citation: 'Telling sources apart by moving one of them', standing: 'common practice, no source' },
  ],
  example: {
    resolution: '9 kHz',
    sources: 'buck; 420 kHz; 500\nclock; 24 MHz; 50',
    peaks: '420 kHz; 61\n1.26 MHz; 54\n24 MHz; 48\n25.2 MHz; 41\n77.83 MHz; 38\n168 MHz; 44',
  },
} as const
